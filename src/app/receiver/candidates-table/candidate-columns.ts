import type { Candidate } from '../../../../shared/contracts/candidates';
import type { Receiver } from '../../../../shared/radio/receiver';
import type { Period } from '../../../../shared/radio/site';
import { change, kilohertz, percent, tenths } from '../../charts/readings';
import type { CandidateSort } from '../address/choice-view';

/** A term by which candidates are told apart. */
export interface CandidateColumn {
  readonly key: string;
  readonly label: string;
  /** Sorts by this; null goes last. */
  readonly value: (candidate: Candidate) => number | null;
  readonly text: (candidate: Candidate) => string;
  /** Which end is the better one; a list is sorted from there. */
  readonly best: 'low' | 'high';
}

const NOTHING = '\u2013';

const khz = (hz: number | null): string => (hz === null ? NOTHING : kilohertz(hz));

/** Beat of the harmonic of the IF that whistles nearest to a channel. */
function nearestBeat({ harmonics }: Candidate): { harmonic: number; beatHz: number } | null {
  const beats = harmonics.flatMap(({ harmonic, beatHz }) =>
    beatHz === null ? [] : { harmonic, beatHz },
  );
  return beats.sort((a, b) => a.beatHz - b.beatHz)[0] ?? null;
}

function ratio(
  key: 'breakthrough' | 'image' | 'products',
  label: string,
  period: Period,
): CandidateColumn {
  const worst = (candidate: Candidate) => candidate[period]?.[key].worstRatioDb ?? null;
  return {
    key,
    label,
    best: 'high',
    value: worst,
    text: (candidate) => {
      const found = worst(candidate);
      return found === null ? NOTHING : tenths(found);
    },
  };
}

function changeText(candidate: Candidate, period: Period): string {
  const { breakthroughChangeDb = null, changeSigmaDb = null } = candidate[period] ?? {};
  if (breakthroughChangeDb === null) return NOTHING;
  const sigma = changeSigmaDb === null ? '' : ` ±${tenths(changeSigmaDb)}`;
  return change(breakthroughChangeDb) + sigma;
}

/**
 * Every term in its own column; ratios and changes are those of the period. A set without a BFO
 * has none to move.
 */
export const candidateColumns = (
  period: Period,
  { bfo }: Pick<Receiver, 'bfo'>,
): readonly CandidateColumn[] =>
  allColumns(period).filter(({ key }) => key !== 'bfo' || bfo !== null);

const allColumns = (period: Period): readonly CandidateColumn[] => [
  ...heardColumns(period),
  ...frequencyColumns,
  ...effortColumns,
];

/** What is heard with the candidate. */
const heardColumns = (period: Period): readonly CandidateColumn[] => [
  {
    key: 'deficit',
    label: $localize`Left to be desired, dB`,
    best: 'low',
    value: ({ deficitDb }) => deficitDb,
    text: ({ deficitDb }) => tenths(deficitDb),
  },
  {
    key: 'change',
    label: $localize`Break\u00ADthrough against now`,
    best: 'low',
    value: (candidate) => candidate[period]?.breakthroughChangeDb ?? null,
    text: (candidate) => changeText(candidate, period),
  },
  ratio('breakthrough', $localize`Worst break\u00ADthrough, ratio dB`, period),
  ratio('image', $localize`Worst image, ratio dB`, period),
  ratio('products', $localize`Worst product, ratio dB`, period),
];

/** Where the candidate and its harmonics lie. */
const frequencyColumns: readonly CandidateColumn[] = [
  {
    key: 'harmonic',
    label: $localize`Nearest harmonic whistle, kHz`,
    best: 'high',
    value: (candidate) => nearestBeat(candidate)?.beatHz ?? null,
    text: (candidate) => {
      const beat = nearestBeat(candidate);
      return beat
        ? $localize`${kilohertz(beat.beatHz)}:beat: (${beat.harmonic}:order: × IF)`
        : NOTHING;
    },
  },
  {
    key: 'raster',
    label: $localize`To the raster: IF, twice, thrice, kHz`,
    best: 'high',
    value: ({ rasterDistanceHz }) => rasterDistanceHz.if,
    text: ({ rasterDistanceHz: d }) => [d.if, d.twice, d.thrice].map(khz).join(' / '),
  },
  {
    key: 'intermodulation',
    label: $localize`Inter\u00ADmodulation, pairs`,
    best: 'low',
    value: ({ intermodulation }) => intermodulation.count,
    text: ({ intermodulation }) => String(intermodulation.count),
  },
  {
    key: 'window',
    label: $localize`Holds from – to, kHz`,
    best: 'high',
    value: ({ windowHz }) => windowHz && windowHz.high - windowHz.low,
    text: ({ windowHz }) =>
      windowHz ? `${kilohertz(windowHz.low)} – ${kilohertz(windowHz.high)}` : NOTHING,
  },
];

/** What must move with it, and what that costs. */
const effortColumns: readonly CandidateColumn[] = [
  {
    key: 'bfo',
    label: $localize`BFO moves, kHz`,
    best: 'low',
    value: ({ bfoShiftHz }) => bfoShiftHz && Math.abs(bfoShiftHz),
    text: ({ bfoShiftHz }) => khz(bfoShiftHz),
  },
  {
    key: 'capacitance',
    label: $localize`IF capacitance`,
    best: 'low',
    value: ({ capacitanceChange }) => Math.abs(capacitanceChange),
    text: ({ capacitanceChange }) => percent(capacitanceChange),
  },
  {
    key: 'tracking',
    label: $localize`Tracking costs, dB`,
    best: 'low',
    value: ({ trackingCostDb }) => trackingCostDb,
    text: ({ trackingCostDb }) => (trackingCostDb === null ? NOTHING : tenths(trackingCostDb)),
  },
  {
    key: 'reach',
    label: $localize`Within reach`,
    best: 'low',
    value: ({ reachable }) => Number(!reachable.ok),
    text: ({ reachable }) => (reachable.ok ? $localize`yes` : (reachable.reason ?? $localize`no`)),
  },
];

/** Candidates by a column, or in the order of the ranking when none is chosen. */
export function sortedCandidates(
  candidates: readonly Candidate[],
  columns: readonly CandidateColumn[],
  sort: CandidateSort | null,
): Candidate[] {
  const { active, direction } = sort ?? {};
  const read =
    active === 'if'
      ? ({ ifHz }: Candidate) => ifHz
      : columns.find(({ key }) => key === active)?.value;
  if (!read) return [...candidates];
  const sign = direction === 'asc' ? 1 : -1;
  return [...candidates].sort((a, b) => {
    const [left, right] = [read(a), read(b)];
    if (left === null || right === null) return Number(left === null) - Number(right === null);
    return sign * (left - right);
  });
}
