import { formatQuantity, parseQuantity, quantities, type QuantityName } from './quantity';

const read = (text: string, name: QuantityName): number | null => {
  const reading = parseQuantity(text, name);
  if ('problem' in reading) throw new Error(reading.problem);
  return reading.value;
};
const problem = (text: string, name: QuantityName): string => {
  const reading = parseQuantity(text, name);
  return 'problem' in reading ? reading.problem : '';
};

describe('parseQuantity', () => {
  it.each([
    '455',
    '455 kHz',
    '455kHz',
    '0,455 MHz',
    '0.455MHz',
    '455000 Hz',
    '455,000',
    '455 kc/s',
  ])('reads "%s" as 455 kHz', (text) => {
    expect(read(text, 'frequency')).toBe(455_000);
  });

  it.each([
    ['1 602', 'frequency', 1_602_000],
    ['1\u00a0602,5', 'frequency', 1_602_500],
    ['18.2m', 'frequency', 18_200_000],
    ['3500', 'tone', 3500],
    ['3.5 kHz', 'tone', 3500],
    ['-40', 'decibels', -40],
    ['−3,5 dB', 'decibels', -3.5],
    ['70 dB(µV/m)', 'field', 70],
    ['200', 'capacitance', 2e-10],
    ['1,5nF', 'capacitance', 1.5e-9],
    ['0.1 µF', 'capacitance', 1e-7],
    ['180', 'inductance', 1.8e-4],
    ['1.2 mH', 'inductance', 1.2e-3],
    ['500 W', 'power', 500],
    ['2 MW', 'power', 2e6],
    ['47 kΩ', 'resistance', 47_000],
    ['-12,25°', 'degrees', -12.25],
    ['6', 'percent', 0.06],
    ['.5', 'plain', 0.5],
  ] as const)('reads "%s" as %s', (text, name, value) => {
    expect(read(text, name)).toBe(value);
  });

  it('takes an empty text for no value', () => {
    expect(read('  ', 'frequency')).toBeNull();
  });

  it.each(['abc', '1,234.5', '--4', '4-5', '.', 'kHz', '1e5'])('refuses "%s"', (text) => {
    expect(problem(text, 'frequency')).not.toBe('');
  });

  it('never takes milliwatts for megawatts', () => {
    expect(problem('5 mW', 'power')).toContain('mW');
  });

  it('names the unit it does not know and the one it wants', () => {
    expect(problem('455 volts', 'frequency')).toContain('volts');
    expect(problem('455 volts', 'frequency')).toContain('kHz');
    expect(problem('60 dB', 'plain')).toContain('without a unit');
  });
});

describe('formatQuantity', () => {
  it.each([
    [455_000, 'frequency', '455'],
    [453_500, 'frequency', '453.5'],
    [2e-10, 'capacitance', '200'],
    [0.06, 'percent', '6'],
    [-40, 'decibels', '-40'],
    [null, 'frequency', ''],
  ] as const)('writes %s (%s) as "%s"', (value, name, text) => {
    expect(formatQuantity(value, name)).toBe(text);
  });

  it('writes what is read back as the same value', () => {
    for (const name of Object.keys(quantities) as QuantityName[]) {
      for (const typed of [0, 1, 7.25, 455, 1602.5, 12_345.678]) {
        const value = read(String(typed), name);

        expect(read(formatQuantity(value, name), name)).toBe(value);
      }
    }
  });
});
