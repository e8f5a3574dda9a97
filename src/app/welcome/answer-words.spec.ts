import type { Candidate } from '../../../shared/contracts/candidates';
import { setTypes } from '../core/set-types';
import { adviceWords, betterIf, verdictWords } from './answer-words';
import type { Trial } from './trial';

const none = { deficitDb: 0, worstRatioDb: null, grade: null, dialHz: null, station: null };
const judged = (image: Partial<typeof none> | object, breakthrough: object = {}) => ({
  breakthrough: { ...none, ...breakthrough },
  image: { ...none, ...image },
  products: none,
  breakthroughChangeDb: null,
  changeSigmaDb: null,
});
const candidate = (ifHz: number, deficitDb: number, night = judged({}), ok = true): Candidate => ({
  ifHz,
  deficitDb,
  night,
  reachable: { ok, reason: ok ? null : 'beyond the cans' },
  rasterDistanceHz: { if: null, twice: null, thrice: null },
  windowHz: null,
  harmonics: [],
  intermodulation: { count: 0, nearestBeatHz: null },
  bfoShiftHz: null,
  capacitanceChange: 0,
  trackingCostDb: null,
});
const answer = (present: Candidate, ...candidates: Candidate[]) => ({
  present,
  candidates,
  ranking: '',
});
const [type] = setTypes;
if (!type) throw new Error('There are no types of set.');
const trial: Trial = { type, ifHz: 560_000, ituRegion: 2, noise: 'rural', period: 'night' };

describe('the advice to a visitor', () => {
  it('says where to go and what that does to the worst', () => {
    const present = candidate(
      560_000,
      40,
      judged({ deficitDb: 5 }, { deficitDb: 35, worstRatioDb: 4 }),
    );
    const best = candidate(555_000, 3, judged({ deficitDb: 3 }, { worstRatioDb: 27.4 }));

    expect(adviceWords(answer(present, best), trial)).toBe(
      'An IF of 560\u00a0kHz sits on a channel here. Set it to 555 kHz: stations on or near the ' +
        'IF then lie 23 dB lower at their worst. Oscillator and dial must follow.',
    );
  });

  it('says what is gone altogether', () => {
    const present = candidate(560_000, 40, judged({ deficitDb: 40, worstRatioDb: 10 }));
    const best = candidate(555_000, 0);

    expect(adviceWords(answer(present, best), trial)).toContain('the images are then gone');
  });

  it('advises to stay where nothing within reach is better', () => {
    const present = candidate(455_000, 10);
    const slightly = candidate(456_000, 9.5);

    expect(adviceWords(answer(present, slightly), { ...trial, ifHz: 455_000 })).toBe(
      'An IF of 455\u00a0kHz is clear of the channels here. Leave it there: no IF within reach of ' +
        'cores and trimmers is better.',
    );
  });

  it('passes over what cores and trimmers do not reach', () => {
    const far = candidate(500_000, 0, judged({}), false);
    const near = candidate(555_000, 20);

    expect(betterIf(answer(candidate(560_000, 40), far, near))).toBe(555_000);
  });

  it('tells how far the next channel is', () => {
    const words = adviceWords(answer(candidate(556_000, 0)), { ...trial, ifHz: 556_000 });

    expect(words).toContain('is 4 kHz from a channel here.');
  });
});

describe('the verdict for a visitor', () => {
  it('counts, and names the loudest stranger on an empty dial', () => {
    const harm = { station: 1, dialHz: 6e5, ratioDb: 3, grade: 'annoying' } as const;
    const verdict = {
      usable: 12,
      harmed: [harm],
      emptyDial: { dialHz: 612_000, station: 1, overNoiseDb: 29.4 },
      deficitDb: 9,
    };

    expect(verdictWords({ verdict, warnings: [], skipped: [], bands: [] }, 'day')).toBe(
      'By day the set harms 1 of 12 stations that could be heard well. On an empty dial the ' +
        'loudest thing that does not belong there is at 612 kHz, 29 dB over the noise.',
    );
  });
});
