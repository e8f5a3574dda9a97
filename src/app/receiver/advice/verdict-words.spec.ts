import type { Assessment } from '../../../../shared/contracts/assessment';
import { verdictSentences } from './verdict-words';

type Verdict = Assessment['verdict'];

const nameOf = () => 'Alder';
const harm = { station: 1, dialHz: 612_000, ratioDb: 3, grade: 'very-annoying' } as const;
const verdict = (changes: Partial<Verdict>): Verdict => ({
  usable: 12,
  harmed: [],
  emptyDial: null,
  deficitDb: 0,
  ...changes,
});
const words = (now: Verdict, before?: Verdict) => verdictSentences(now, before, 'night', nameOf);

describe('the verdict in words', () => {
  it('counts, and says what changes', () => {
    const before = verdict({ harmed: [harm, harm, harm], deficitDb: 60 });

    expect(words(verdict({ harmed: [harm], deficitDb: 20 }), before)).toEqual([
      'By night 12 stations are heard well; the set harms 1 of them.',
      'That is 2 fewer than now.',
      'An empty dial is silent but for the noise.',
    ]);
  });

  it('tells equal counts apart by what is missing', () => {
    const before = verdict({ harmed: [harm], deficitDb: 30 });

    expect(words(verdict({ harmed: [harm], deficitDb: 12.4 }), before)).toContain(
      'As many as now, but 18 dB less is missing.',
    );
    expect(words(before, before)).toContain('That is as it is now.');
  });

  it('names what is heard on an empty dial', () => {
    const emptyDial = { dialHz: 612_000, station: 1, overNoiseDb: 29.1 };

    expect(words(verdict({ emptyDial }))).toContain(
      'On an empty dial Alder is heard at 612\u00a0kHz, 29 dB over the noise.',
    );
  });

  it('says so when nothing is heard well', () => {
    expect(words(verdict({ usable: 0 }))[0]).toBe(
      'By night no listed station of these bands stands clear of the noise.',
    );
  });
});
