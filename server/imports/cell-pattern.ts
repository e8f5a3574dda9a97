import type { ImportUnit } from '../../shared/contracts/list-import.ts';
import { type DecimalMark, isBlank, readNumber } from './cell-number.ts';
import { readPower } from './cell-unit.ts';

const BEARINGS = 36;
/** A null of an aerial is never deeper than the sky and the ground around it leave it. */
const DEEPEST_DB = -60;
const HIGHEST_DB = 40;

/**
 * Gain at one bearing, dB: over the power (dB), under the strongest bearing (relative field), or, in
 * units of power, the power itself in dBW. Undefined: nothing said; null: not to be read.
 */
export function readGain(
  cell: string,
  unit: ImportUnit,
  mark: DecimalMark,
): number | null | undefined {
  if (isBlank(cell)) return undefined;
  if (unit === 'dB') return within(readNumber(cell.replace(/\s*dB$/i, ''), mark), HIGHEST_DB);
  if (unit === 'relative') {
    const ratio = readNumber(cell, mark);
    return ratio === null || ratio < 0 || ratio > 1 ? null : deepened(20 * Math.log10(ratio));
  }
  const watts = readPower(cell, unit, mark);
  return watts === null ? null : 10 * Math.log10(watts);
}

const within = (gain: number | null, most: number): number | null =>
  gain === null || Math.abs(gain) > Math.max(most, -DEEPEST_DB) ? null : deepened(gain);

const deepened = (gain: number): number => Math.max(DEEPEST_DB, gain);

/** Gains at any bearings filled up to 36, linear in dB from each bearing to the next. */
export function everyTenDegrees(known: readonly (readonly [number, number])[]): number[] {
  const sorted = [...known].sort(([a], [b]) => a - b);
  const [first] = sorted;
  const last = sorted.at(-1);
  if (!first || !last) throw new RangeError('known: needs a gain at one bearing at least');
  const round = [[last[0] - 360, last[1]] as const, ...sorted, [first[0] + 360, first[1]] as const];
  return Array.from({ length: BEARINGS }, (_, index) => {
    const bearing = index * 10;
    const after = round.findIndex(([at]) => at >= bearing);
    const [high = 0, gain = 0] = round[after] ?? [];
    const [low = 0, before = 0] = round[after - 1] ?? [];
    return hundredths(high === bearing ? gain : between(bearing, low, high, before, gain));
  });
}

const between = (at: number, low: number, high: number, before: number, after: number): number =>
  before + ((at - low) / (high - low)) * (after - before);

/**
 * Powers by bearing, dBW, as gains over the station's power; without one the strongest bearing is
 * the power. A station silent all round has none.
 */
export function gainsOfPowers(
  levels: readonly (readonly [number, number])[],
  powerW: number | null,
): { readonly patternDb: number[]; readonly powerW: number } | null {
  const strongest = Math.max(...levels.map(([, level]) => level));
  if (!Number.isFinite(strongest)) return null;
  const watts = powerW !== null && powerW > 0 ? powerW : 10 ** (strongest / 10);
  const reference = 10 * Math.log10(watts);
  const gains = levels.map(([at, level]): [number, number] => [at, deepened(level - reference)]);
  return { patternDb: everyTenDegrees(gains), powerW: Number(watts.toPrecision(12)) };
}

const hundredths = (gain: number): number => Math.round(gain * 100) / 100;
