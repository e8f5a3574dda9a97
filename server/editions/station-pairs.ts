import type { DifferenceKind } from '../../shared/contracts/edition-differences.ts';
import type { StationRecord } from '../../shared/contracts/station-list.ts';
import { pathLength, type Place } from '../../shared/radio/propagation/path.ts';

/** A station of one edition that the other has not quite the same. */
export type Differing = StationRecord & { readonly identity: string };

/** What became of one station; both null cannot be. */
export interface StationPair {
  readonly before: Differing | null;
  readonly after: Differing | null;
}

/** Another frequency at the same place, near enough for two surveys of one mast. */
const SAME_PLACE_M = 1000;

/**
 * Pairs the stations that differ: those of one identity, the nearest first; then, of what is left,
 * those of one name at one place, which changed frequency. The rest was added or is gone.
 */
export function* stationPairs(
  before: readonly Differing[],
  after: readonly Differing[],
): Generator<StationPair> {
  const left = { before: [] as Differing[], after: [] as Differing[] };
  const earlier = grouped(before, ({ identity }) => identity);
  const later = grouped(after, ({ identity }) => identity);
  for (const identity of new Set([...earlier.keys(), ...later.keys()])) {
    yield* nearestFirst(earlier.get(identity) ?? [], later.get(identity) ?? [], Infinity, left);
  }
  const lost = { before: [] as Differing[], after: [] as Differing[] };
  const gone = grouped(left.before, nameOf);
  const come = grouped(left.after, nameOf);
  for (const name of new Set([...gone.keys(), ...come.keys()])) {
    yield* nearestFirst(gone.get(name) ?? [], come.get(name) ?? [], SAME_PLACE_M, lost);
  }
  for (const station of lost.before) yield { before: station, after: null };
  for (const station of lost.after) yield { before: null, after: station };
}

/** All that changed of a paired station. */
export function changesOf({ before, after }: StationPair): DifferenceKind[] {
  if (!before) return ['added'];
  if (!after) return ['gone'];
  const differs = (...keys: readonly (keyof StationRecord)[]) =>
    keys.some((key) => String(before[key]) !== String(after[key]));
  const kinds: [DifferenceKind, boolean][] = [
    ['moved', differs('latitude', 'longitude')],
    ['changed-power', differs('powerDayW', 'powerNightW')],
    ['changed-frequency', differs('frequencyHz')],
    ['changed-other', differs('name', 'callSign', 'hours', 'note', 'patternDb')],
  ];
  return kinds.flatMap(([kind, isSo]) => (isSo ? [kind] : []));
}

/** How far a station moved; null where a place is missing. */
export function movedBy({ before, after }: StationPair): number | null {
  const from = before && placeOf(before);
  const to = after && placeOf(after);
  return from && to ? pathLength(from, to) : null;
}

/** Power after over power before, dB; null where either is missing or silent. */
export const powerChange = (before = 0, after = 0): number | null =>
  before > 0 && after > 0 ? 10 * Math.log10(after / before) : null;

type Leftovers = Record<'before' | 'after', Differing[]>;

function* nearestFirst(
  before: readonly Differing[],
  after: readonly Differing[],
  within: number,
  left: Leftovers,
): Generator<StationPair> {
  const open = { before: new Set(before), after: new Set(after) };
  for (const { one, other } of byDistance(before, after, within)) {
    if (!open.before.has(one) || !open.after.has(other)) continue;
    open.before.delete(one);
    open.after.delete(other);
    yield { before: one, after: other };
  }
  left.before.push(...open.before);
  left.after.push(...open.after);
}

/** Most pairs of stations of one identity that are measured; beyond, the list's order decides. */
const MAX_PAIRS = 10_000;

function byDistance(before: readonly Differing[], after: readonly Differing[], within: number) {
  if (before.length * after.length > MAX_PAIRS) {
    return before.flatMap((one, index) => {
      const other = after[index];
      return other ? [{ one, other }] : [];
    });
  }
  return before
    .flatMap((one) => after.map((other) => ({ one, other, apart: apart(one, other) })))
    .filter((pair) => within === Infinity || pair.apart <= within)
    .sort((a, b) => (a.apart < b.apart ? -1 : Number(a.apart > b.apart)));
}

const apart = (before: Differing, after: Differing): number =>
  movedBy({ before, after }) ?? Infinity;

const nameOf = ({ callSign, name }: Differing): string => (callSign || name).toLowerCase();

function placeOf({ latitude, longitude }: StationRecord): Place | null {
  return latitude === null || longitude === null ? null : { latitude, longitude };
}

function grouped(stations: readonly Differing[], keyOf: (station: Differing) => string) {
  const groups = new Map<string, Differing[]>();
  for (const station of stations) {
    const key = keyOf(station);
    const group = groups.get(key);
    if (group) group.push(station);
    else groups.set(key, [station]);
  }
  return groups;
}
