import type { Candidate } from '../../../../../shared/contracts/candidates';
import type { WholePlan } from '../../../../../shared/contracts/plan';
import type { Period } from '../../../../../shared/radio/site';
import { tenths, whole } from '../../../charts/readings';
import { type CandidateColumn, candidateColumns } from '../../candidates-table/candidate-columns';

/** How the second of two plans stands to the first in one respect. */
export type Outcome = 'better' | 'worse' | 'same' | 'differs';

/** One respect in which two plans are compared. */
export interface ComparedTerm {
  readonly label: string;
  readonly first: string;
  readonly second: string;
  readonly outcome: Outcome;
}

/** What makes a term better; what is in neither set only differs. */
const lessIsBetter = new Set([
  'deficit',
  'change',
  'intermodulation',
  'bfo',
  'capacitance',
  'tracking',
  'reach',
]);
const moreIsBetter = new Set(['breakthrough', 'image', 'products', 'window']);
/** Of these a missing value means that nothing is heard: better than any ratio. */
const silentIsBest = new Set(['breakthrough', 'image', 'products']);

/** Compares by the figures themselves; what reads the same counts as the same. */
export function outcomeOf(
  key: string,
  [first, second]: readonly [number | null, number | null],
  readsSame: boolean,
): Outcome {
  if (readsSame) return 'same';
  const isSilentBest = silentIsBest.has(key);
  if ((first === null || second === null) && !isSilentBest) return 'differs';
  const [from, to] = [first ?? Infinity, second ?? Infinity];
  if (moreIsBetter.has(key)) return to > from ? 'better' : 'worse';
  if (lessIsBetter.has(key)) return to < from ? 'better' : 'worse';
  return 'differs';
}

type Plans = readonly [WholePlan, WholePlan];

/** Every term of two plans for a period: what is heard first, then what moved along. */
export function comparedTerms([first, second]: Plans, period: Period): ComparedTerm[] {
  const bfo = first.receiver.bfo ?? second.receiver.bfo;
  const ofIf = candidateColumns(period, { bfo }).map((column) =>
    ofColumn(column, first.results.chosen, second.results.chosen),
  );
  return [...ofVerdict([first, second], period), ...ofIf];
}

function ofColumn(
  { key, label, value, text }: CandidateColumn,
  first: Candidate,
  second: Candidate,
): ComparedTerm {
  const texts = { first: text(first), second: text(second) };
  const values = [value(first), value(second)] as const;
  return { label, ...texts, outcome: outcomeOf(key, values, texts.first === texts.second) };
}

function ofVerdict([first, second]: Plans, period: Period): ComparedTerm[] {
  const [from, to] = [first.results[period], second.results[period]];
  const term = (
    label: string,
    [a, b]: readonly [number, number],
    isMoreBetter: boolean,
    text: (value: number) => string,
  ): ComparedTerm => ({
    label,
    first: text(a),
    second: text(b),
    outcome: text(a) === text(b) ? 'same' : b > a === isMoreBetter ? 'better' : 'worse',
  });
  return [
    term($localize`Stations heard well`, [from.usable, to.usable], true, String),
    term($localize`Stations harmed`, [from.harmed.length, to.harmed.length], false, String),
    term($localize`Missing in this period, dB`, [from.deficitDb, to.deficitDb], false, tenths),
    term(
      $localize`Loudest on an empty dial, dB over the noise`,
      [from.emptyDial?.overNoiseDb ?? 0, to.emptyDial?.overNoiseDb ?? 0],
      false,
      whole,
    ),
  ];
}

/** A harmed station of one or both plans. */
export interface ComparedHarm {
  readonly name: string;
  readonly frequencyHz: number;
  readonly first: number | null;
  readonly second: number | null;
}

/** The harmed stations of two plans, known again by name, call sign and frequency. */
export function comparedHarm(plans: Plans, period: Period) {
  const [first, second] = plans.map((plan) => harmedOf(plan, period));
  const all = new Map([...(first ?? []), ...(second ?? [])]);
  const rows = [...all].map(([key, { name, frequencyHz }]): ComparedHarm => ({
    name,
    frequencyHz,
    first: first?.get(key)?.ratioDb ?? null,
    second: second?.get(key)?.ratioDb ?? null,
  }));
  rows.sort((a, b) => a.frequencyHz - b.frequencyHz);
  return {
    added: rows.filter((each) => each.first === null),
    removed: rows.filter((each) => each.second === null),
    still: rows.filter((each) => each.first !== null && each.second !== null),
  };
}

function harmedOf({ stations, results }: WholePlan, period: Period) {
  return new Map(
    results[period].harmed.flatMap(({ station, ratioDb }) => {
      const found = stations[station];
      if (!found) return [];
      const { name, callSign, frequencyHz } = found;
      return [[`${frequencyHz}|${callSign}|${name}`, { name, frequencyHz, ratioDb }] as const];
    }),
  );
}

/** The comparison in a sentence, from its own counts. */
export function comparisonSentence(
  terms: readonly ComparedTerm[],
  { added, removed, still }: ReturnType<typeof comparedHarm>,
): string {
  const count = (outcome: Outcome) => terms.filter((each) => each.outcome === outcome).length;
  const counts = $localize`The second plan is better in ${count('better')}:better: terms, worse in ${count('worse')}:worse: and the same in ${count('same')}:same:.`;
  if (added.length + removed.length + still.length === 0)
    return $localize`${counts}:counts: Neither harms a station.`;
  if (added.length + removed.length === 0)
    return $localize`${counts}:counts: The same stations are harmed.`;
  return $localize`${counts}:counts: Stations no longer harmed: ${removed.length}:removed:; newly harmed: ${added.length}:added:.`;
}
