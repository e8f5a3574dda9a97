import { receiverDraft, type ReceiverInput } from '../../../../shared/contracts/receiver';
import { outOfReach } from '../../../../shared/radio/candidates/if-reach';
import { candidateRange, reachOf } from './candidate-range';

const receiver = (changes: Partial<ReceiverInput>) =>
  receiverDraft.parse({
    ifHz: 455_000,
    selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
    bands: [{ name: 'MW', lowHz: 550_000, highHz: 1_600_000, oscillator: 'above' }],
    ...changes,
  });

describe('the candidates asked for', () => {
  it('cover the range of the cans in steps of 500 Hz', () => {
    expect(candidateRange(receiver({}))).toEqual({ fromHz: 428_000, toHz: 482_000, stepHz: 500 });
  });

  it.each([110_000, 455_000, 1_600_000, 10_700_000, 45_000_000])(
    'are at most 400 and on multiples of the step for an IF of %i Hz',
    (ifHz) => {
      const { fromHz, toHz, stepHz } = candidateRange(receiver({ ifHz, ifRange: 0.9 }));

      expect((toHz - fromHz) / stepHz).toBeLessThan(400);
      expect(fromHz % stepHz).toBe(0);
      expect(fromHz).toBeGreaterThanOrEqual(1000);
      expect(toHz).toBeGreaterThan(fromHz);
    },
  );
});

describe('the reach of the IF', () => {
  it('is what the cans allow', () => {
    expect(reachOf(receiver({}))).toEqual({ low: 427_700, high: 482_300 });
  });

  it('ends where a fixed filter does', () => {
    const fixedFilter = { kind: 'mechanical', centreHz: 455_000, widthHz: 3000 } as const;

    expect(reachOf(receiver({ fixedFilter }))).toEqual({ low: 453_500, high: 456_500 });
  });

  it('ends where the BFO can no longer follow', () => {
    const bfo = { centreHz: 455_000, rangeHz: 6000, pitchHz: 1000 };

    expect(reachOf(receiver({ bfo }))).toEqual({ low: 449_000, high: 461_000 });
  });

  it('ends below a band whose oscillator runs below the signal', () => {
    const bands = [{ name: 'MW', lowHz: 460_000, highHz: 1_600_000, oscillator: 'below' } as const];

    expect(reachOf(receiver({ bands })).high).toBe(459_999);
  });

  it.each([448_999, 449_000, 461_000, 461_001])(
    'is the reach the engine tells of at %i Hz',
    (hz) => {
      const set = receiver({ bfo: { centreHz: 455_000, rangeHz: 6000, pitchHz: 1000 } });
      const { low, high } = reachOf(set);

      expect(hz >= low && hz <= high).toBe(outOfReach(set, hz) === null);
    },
  );

  it('always holds the present IF', () => {
    const fixedFilter = { kind: 'crystal', centreHz: 465_000, widthHz: 1000 } as const;
    const { low, high } = reachOf(receiver({ fixedFilter }));

    expect(low).toBeLessThanOrEqual(455_000);
    expect(high).toBeGreaterThanOrEqual(455_000);
  });
});
