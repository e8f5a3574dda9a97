import { selectivityControls } from '../receiver-form/selectivity-controls';
import { widthsInWords } from './selectivity-widths';

const fieldsOf = (change: Parameters<ReturnType<typeof selectivityControls>['patchValue']>[0]) => {
  const controls = selectivityControls();
  controls.patchValue(change);
  return controls.getRawValue();
};

describe('the widths of a selectivity', () => {
  it('are a shape factor where they are given', () => {
    const fields = fieldsOf({ b6Hz: 6000, b60Hz: 22_000 });

    expect(widthsInWords(fields, null)).toBe('Shape factor 3.67');
  });

  it('of two critical pairs have the shape factor 5.63', () => {
    const fields = fieldsOf({ kind: 'transformers', count: 2, q: 60, coupling: 1 });

    expect(widthsInWords(fields, 455_000)).toContain('shape factor 5.6');
  });

  it('are read off a measured curve', () => {
    const points = [
      { offsetHz: 0, rejectionDb: 0 },
      { offsetHz: 3000, rejectionDb: 6 },
    ];

    expect(widthsInWords(fieldsOf({ kind: 'table', points }), 455_000)).toContain(
      '6\u00a0kHz wide at −6 dB',
    );
  });

  it('are not told of half-filled fields', () => {
    expect(widthsInWords(fieldsOf({ kind: 'transformers' }), 455_000)).toBeNull();
    expect(widthsInWords(fieldsOf({ kind: 'table' }), 455_000)).toBeNull();
  });
});
