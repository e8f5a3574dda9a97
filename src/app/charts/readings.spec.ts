import { bandUnit, change, decibels, distance, kilohertz, percent, whole } from './readings';

describe('readings', () => {
  it.each([
    [554_000, '554'],
    [553_500, '553.5'],
    [818_333, '818.333'],
    [0, '0'],
    [-500, '\u22120.5'],
  ])('%i Hz reads %s kHz', (hz, text) => {
    expect(kilohertz(hz)).toBe(text);
  });

  it('reads a band in kilohertz or, from 3 MHz, in megahertz', () => {
    expect(bandUnit(1_602_000).write(1_602_000)).toBe('1602');
    expect(bandUnit(18_000_000).write(5_950_000)).toBe('5.95');
    expect(bandUnit(18_000_000).unit).toBe('MHz');
  });

  it('shows a dash for what is missing, and a true minus', () => {
    expect(decibels(null)).toBe('\u2013');
    expect(decibels(-4.26)).toBe('\u22124.3 dB');
    expect(decibels(-0.04)).toBe('0.0 dB');
    expect(whole(-15.6)).toBe('\u221216');
  });

  it('gives changes their sign', () => {
    expect(change(3.24)).toBe('+3.2 dB');
    expect(change(0)).toBe('0.0 dB');
    expect(percent(0.0181)).toBe('+1.81 %');
    expect(percent(-0.0628)).toBe('\u22126.28 %');
  });

  it('gives distances in kilometres, finer when near', () => {
    expect(distance(12_340)).toBe('12.3 km');
    expect(distance(1_329_018)).toBe('1329 km');
  });
});
