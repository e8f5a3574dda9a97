/**
 * The order of candidates for the IF.
 *
 * Source: own rule: reach, then deficit, then whistles, then the smaller shift.
 *
 * @module radio/candidates/candidate-order
 */
import { type HarmonicOnChannel, nearestWhistle } from './harmonics-on-channels.ts';

/** What the order looks at. */
export interface Orderable {
  readonly ifHz: number;
  readonly reachable: { readonly ok: boolean };
  readonly deficitDb: number;
  readonly harmonics: readonly HarmonicOnChannel[];
}

/** The term of the order that puts a candidate before another. */
export type RankingTerm = 'reach' | 'deficit' | 'harmonic-beat' | 'shift' | 'lower';

/** Deficits this close are equal: sums of the same terms in another order, decibels. */
const EQUAL_DB = 1e-9;

/**
 * Compares two candidates: within reach before not; then the smaller deficit; then the larger beat
 * of the nearest harmonic whistle to a channel; then the smaller shift; then the lower.
 *
 * @param one A candidate.
 * @param other Another.
 * @param presentHz The present IF, hertz.
 * @returns Negative when `one` comes first.
 *
 * @example
 *   compareCandidates(candidates[0], candidates[1], 455_000) < 0; // true: the deficit is smaller
 */
export function compareCandidates(one: Orderable, other: Orderable, presentHz: number): number {
  return decide(one, other, presentHz).difference;
}

/**
 * The term that decides between two candidates.
 *
 * @param first The candidate that comes first.
 * @param second The one after it.
 * @param presentHz The present IF, hertz.
 * @returns The term.
 * @example
 *   decidingTerm(candidates[0], candidates[1], 455_000); // 'deficit'
 */
export function decidingTerm(first: Orderable, second: Orderable, presentHz: number): RankingTerm {
  return decide(first, second, presentHz).term;
}

function decide(
  one: Orderable,
  other: Orderable,
  presentHz: number,
): { term: RankingTerm; difference: number } {
  const reach = Number(other.reachable.ok) - Number(one.reachable.ok);
  if (reach !== 0) return { term: 'reach', difference: reach };
  const deficit = steps(one.deficitDb) - steps(other.deficitDb);
  if (deficit !== 0) return { term: 'deficit', difference: deficit };
  const [beat, otherBeat] = [nearestWhistle(one.harmonics), nearestWhistle(other.harmonics)];
  if (beat !== otherBeat) return { term: 'harmonic-beat', difference: beat > otherBeat ? -1 : 1 };
  const shift = Math.abs(one.ifHz - presentHz) - Math.abs(other.ifHz - presentHz);
  if (shift !== 0) return { term: 'shift', difference: shift };
  return { term: 'lower', difference: one.ifHz - other.ifHz };
}

function steps(deficitDb: number): number {
  return Math.round(deficitDb / EQUAL_DB);
}

/**
 * Says in a sentence what put the first candidate first.
 *
 * @param ordered The candidates, in order.
 * @param presentHz The present IF, hertz.
 * @returns A sentence.
 * @example
 *   rankingSentence(candidates.slice(0, 1), 455_000); // '450 kHz is the only candidate.'
 */
export function rankingSentence(ordered: readonly Orderable[], presentHz: number): string {
  const [first, second] = ordered;
  if (first === undefined) return 'There is no candidate.';
  if (!first.reachable.ok) return 'No candidate is within reach of the receiver.';
  if (second === undefined) return `${khz(first.ifHz)} is the only candidate.`;
  const names = `${khz(first.ifHz)} comes before ${khz(second.ifHz)}`;
  switch (decidingTerm(first, second, presentHz)) {
    case 'reach':
      return `${names}: it is within reach.`;
    case 'deficit':
      return `${names}: less is missing to the protection ratio, ${whole(first)} against ${whole(second)} dB.`;
    case 'harmonic-beat':
      return `${names}: equal otherwise, its harmonics keep farther from the channels.`;
    case 'shift':
      return `${names}: equal otherwise, it is the smaller shift.`;
    case 'lower':
      return `${names}: equal in everything, it is the lower.`;
  }
}

function khz(hz: number): string {
  return `${hz / 1000} kHz`;
}

/** Tenths where whole decibels would hide the difference. */
function whole({ deficitDb }: Orderable): string {
  return String(Math.round(deficitDb * 10) / 10);
}
