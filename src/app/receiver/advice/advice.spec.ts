import type { Candidate, CandidatesAnswer } from '../../../../shared/contracts/candidates';
import { receiverDraft } from '../../../../shared/contracts/receiver';
import { advise, type AdviceGrounds } from './advice';

const none = { deficitDb: 0, worstRatioDb: null, grade: null, dialHz: null, station: null };
const quiet = {
  breakthrough: none,
  image: none,
  products: none,
  breakthroughChangeDb: null,
  changeSigmaDb: null,
};

const candidate = (changes: Partial<Candidate> & Pick<Candidate, 'ifHz'>): Candidate => ({
  reachable: { ok: true, reason: null },
  deficitDb: 0,
  rasterDistanceHz: { if: null, twice: null, thrice: null },
  day: quiet,
  night: quiet,
  windowHz: null,
  harmonics: [],
  intermodulation: { count: 0, nearestBeatHz: null },
  bfoShiftHz: null,
  capacitanceChange: 0,
  trackingCostDb: null,
  ...changes,
});

const receiver = receiverDraft.parse({
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 3000, b60Hz: 12_000 },
  bfo: { centreHz: 560_000, rangeHz: 3000, pitchHz: 1000 },
  bands: [{ name: 'MW', lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' }],
});

const alder = { id: 1, name: 'Alder', frequencyHz: 560_000, fieldDb: 90, distanceM: 12_000 };

const grounds = (
  answer: CandidatesAnswer,
  changes: Partial<AdviceGrounds> = {},
): AdviceGrounds => ({
  answer,
  receiver,
  stations: [alder],
  channels: [540_000, 550_000, 560_000, 570_000],
  period: 'night',
  ...changes,
});

const onChannel = candidate({ ifHz: 560_000, deficitDb: 40 });
const between = candidate({
  ifHz: 555_000,
  deficitDb: 4,
  windowHz: { low: 554_280, high: 555_740 },
  night: { ...quiet, breakthroughChangeDb: -25.7, changeSigmaDb: 4.2 },
});

describe('the advice', () => {
  it('says where to set the IF, how exactly, what is gained and what must follow', () => {
    const answer = { present: onChannel, candidates: [between, onChannel], ranking: '' };

    expect(advise(grounds(answer))).toEqual({
      kind: 'move',
      ifHz: 555_000,
      text:
        '560 is on a channel here. Set it to 555 ± 0.7 kHz: about 26 dB less breakthrough by ' +
        'night than now (±4); retune the BFO and realign the oscillator of each band.',
    });
  });

  it('names the station beside the IF where there is no raster', () => {
    const answer = { present: onChannel, candidates: [between], ranking: '' };
    const near = { ...alder, frequencyHz: 558_000 };
    const { text } = advise(grounds(answer, { channels: [], stations: [near] }));

    expect(text).toContain('Alder is 2 kHz from 560.');
  });

  it('gives an uneven window by its ends', () => {
    const uneven = { ...between, windowHz: { low: 551_000, high: 555_740 } };
    const { text } = advise(grounds({ present: onChannel, candidates: [uneven], ranking: '' }));

    expect(text).toContain('Set it to 555 kHz (breakthrough stays within 3 dB from 551 to 555.7)');
  });

  it('speaks of the whole when breakthrough is not what is gained', () => {
    const other = { ...between, night: quiet };
    const { text } = advise(grounds({ present: onChannel, candidates: [other], ranking: '' }));

    expect(text).toContain('36 dB less is left to be desired over all');
  });

  it('leaves the IF where it is when nothing is gained', () => {
    const harmless = candidate({ ifHz: 560_000, deficitDb: 0.4 });
    const answer = { present: harmless, candidates: [candidate({ ifHz: 555_000 })], ranking: '' };

    expect(advise(grounds(answer)).text).toBe(
      'Leave it where it is, on 560 kHz: the set harms no station from there.',
    );
  });

  it('never sends anyone beyond the reach of the cans', () => {
    const far = { ...between, reachable: { ok: false, reason: 'beyond the cans' } };
    const { kind } = advise(grounds({ present: onChannel, candidates: [far], ranking: '' }));

    expect(kind).toBe('stay');
  });

  it('says so when no station is in reach', () => {
    const silent = { ...alder, fieldDb: null };
    const answer = { present: onChannel, candidates: [between], ranking: '' };

    expect(advise(grounds(answer, { stations: [silent], period: 'day' }))).toMatchObject({
      kind: 'nothing-heard',
      text: 'No station is in reach by day: nothing here decides between one IF and another.',
    });
  });

  it('names the bands that can be left alone', () => {
    const band = { oscillator: 'above', lowHz: 600_000, highHz: 1_600_000, name: 'MW' } as const;
    const withShortWave = receiverDraft.parse({
      ...receiver,
      bands: [band, { ...band, name: 'SW', lowHz: 6_000_000, highHz: 18_000_000 }],
    });
    const answer = { present: onChannel, candidates: [between], ranking: '' };

    expect(advise(grounds(answer, { receiver: withShortWave })).text).toContain(
      'retune the BFO; realign the oscillator on MW; leave SW alone.',
    );
  });

  it('tells a broad set that it gains nothing by moving', () => {
    const broad = receiverDraft.parse({
      ...receiver,
      selectivity: { kind: 'widths', b6Hz: 8000, b60Hz: 45_000 },
    });
    const answer = {
      present: onChannel,
      candidates: [{ ...between, deficitDb: 39.8 }],
      ranking: '',
    };

    expect(advise(grounds(answer, { receiver: broad })).text).toMatch(
      /^Leave it where it is, on 560 kHz: the set is too broad to gain anything by moving: midway between two channels its IF takes only \d+ dB off them\.$/,
    );
  });

  it('says for how many sites the IF is the best where it is worst', () => {
    const answer = { present: onChannel, candidates: [between], ranking: '' };

    expect(advise(grounds(answer, { sites: 3 })).text).toContain(
      'Of all IFs it is the best where it is worst, over 3 sites.',
    );
  });
});
