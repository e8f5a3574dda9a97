import { describe, expect, it } from 'vitest';

import type { UnwantedCarrier, WhistleSource } from './whistle-cause.ts';
import { whistleTest } from './whistle-test.ts';

const carrier = (cause: WhistleSource): UnwantedCarrier => ({
  cause,
  name: '',
  station: 0,
  frequencyHz: 1_521_000,
  n: 2,
  inIfHz: 454_000,
  moves: -1,
  levelDb: 40,
});

describe('whistleTest', () => {
  it('begins with how the pitch follows the dial', () => {
    expect(whistleTest(carrier('image'), 2)).toMatch(
      /^Turn the dial by 100 Hz: the pitch moves by 200 Hz\. /,
    );
    expect(whistleTest(carrier('adjacent-carrier'), 0)).toMatch(/the pitch stays/);
  });

  it('names the frequency to look at, and how a product of order 2 falls', () => {
    expect(whistleTest(carrier('image'), 2)).toContain('1521 kHz');
    expect(whistleTest(carrier('half-if'), 1)).toContain('falls by 12 dB');
  });

  it.each<[WhistleSource, boolean]>([
    ['breakthrough', true],
    ['if-harmonic', true],
    ['second-oscillator', true],
    ['intermodulation', true],
    ['adjacent-carrier', false],
    ['bfo-harmonic', false],
  ])('of %s carries the caution: %s', (cause, touches) => {
    expect(whistleTest(carrier(cause), 1).includes('isolation transformer')).toBe(touches);
  });
});
