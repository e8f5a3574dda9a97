import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { audibleBeats, FULL, HIGHEST_TONE_HZ, LOWEST_TONE_HZ } from './audible-beats.ts';

const beats = fc.array(
  fc.record({
    pitchHz: fc.integer({ min: 0, max: 20_000 }),
    levelDb: fc.option(fc.double({ min: -200, max: 200, noNaN: true })),
  }),
  { maxLength: 40 },
);
const decibels = (ratio: number): number => 20 * Math.log10(ratio);

describe('beats as tones', () => {
  it('keep their levels to one another', () => {
    const [loud, soft] = audibleBeats([
      { pitchHz: 3000, levelDb: -31 },
      { pitchHz: 1000, levelDb: -11 },
    ]);

    expect([loud?.pitchHz, soft?.pitchHz]).toEqual([1000, 3000]);
    expect(decibels((loud?.amplitude ?? NaN) / (soft?.amplitude ?? NaN))).toBeCloseTo(20, 9);
  });

  it('never exceed full level together, nor leave the range an ear can use', () => {
    fc.assert(
      fc.property(beats, (all) => {
        const tones = audibleBeats(all);
        const sum = tones.reduce((total, { amplitude }) => total + amplitude, 0);
        expect(sum).toBeLessThanOrEqual(FULL + 1e-9);
        for (const { pitchHz, amplitude } of tones) {
          expect(pitchHz).toBeGreaterThanOrEqual(LOWEST_TONE_HZ);
          expect(pitchHz).toBeLessThanOrEqual(HIGHEST_TONE_HZ);
          expect(amplitude).toBeGreaterThan(0);
        }
      }),
    );
  });

  it('sound as soft when every level rises by the same amount', () => {
    fc.assert(
      fc.property(beats, fc.integer({ min: -50, max: 50 }), (all, rise) => {
        const raised = all.map(({ pitchHz, levelDb }) => ({
          pitchHz,
          levelDb: levelDb === null ? null : levelDb + rise,
        }));
        const [before, after] = [audibleBeats(all), audibleBeats(raised)];
        expect(after.length).toBe(before.length);
        after.forEach(({ amplitude }, at) => {
          expect(amplitude).toBeCloseTo(before[at]?.amplitude ?? NaN, 9);
        });
      }),
    );
  });

  it('are silent at zero beat, and where there is none', () => {
    expect(audibleBeats([{ pitchHz: 0, levelDb: 10 }])).toEqual([]);
    expect(audibleBeats([])).toEqual([]);
  });

  it('play what has no level only where nothing else is heard', () => {
    const unknown = { pitchHz: 900, levelDb: null };

    expect(audibleBeats([unknown])).toEqual([{ beat: 0, pitchHz: 900, amplitude: FULL }]);
    expect(audibleBeats([unknown, { pitchHz: 400, levelDb: -60 }]).map(({ beat }) => beat)).toEqual(
      [1],
    );
  });

  it('leave out what the loudest covers', () => {
    const tones = audibleBeats([
      { pitchHz: 500, levelDb: 0 },
      { pitchHz: 900, levelDb: -40.1 },
      { pitchHz: 500, levelDb: -6 },
    ]);

    expect(tones).toEqual([{ beat: 0, pitchHz: 500, amplitude: FULL }]);
  });
});
