import type { ImportUnit } from '../../shared/contracts/list-import.ts';
import { type DecimalMark, readNumber } from './cell-number.ts';

const SCALES: Readonly<Record<string, readonly [ImportUnit, number]>> = {
  hz: ['Hz', 1],
  khz: ['kHz', 1e3],
  mhz: ['MHz', 1e6],
  w: ['W', 1],
  kw: ['kW', 1e3],
};

/** Quantity in hertz or watts: a number in the column's unit, or with a unit of its own behind it. */
export function readQuantity(
  cell: string,
  unit: ImportUnit,
  mark: DecimalMark,
  allowed: readonly ImportUnit[],
): number | null {
  const plain = readNumber(cell, mark);
  const suffixed = plain === null ? /^(.*?\d[.,]?)\s*([a-z]+)$/i.exec(cell.trim()) : null;
  const value = plain ?? readNumber(suffixed?.[1] ?? '', mark);
  if (value === null) return null;
  const name = (suffixed?.[2] ?? unit).toLowerCase();
  if (name === 'dbw') return allowed.includes('dBW') ? 10 ** (value / 10) : null;
  const [known, scale] = SCALES[name] ?? [];
  return known !== undefined && allowed.includes(known) ? value * (scale ?? 1) : null;
}

/** Carrier frequency in whole hertz; null when the cell holds none between 1 kHz and 1 GHz. */
export function readFrequency(cell: string, unit: ImportUnit, mark: DecimalMark): number | null {
  const value = readQuantity(cell, unit, mark, ['Hz', 'kHz', 'MHz']);
  const hertz = value === null ? NaN : Math.round(value);
  return hertz >= 1000 && hertz <= 1_000_000_000 ? hertz : null;
}

/** Power in watts; null when the cell holds none between 0 (silent) and 100 MW. */
export function readPower(cell: string, unit: ImportUnit, mark: DecimalMark): number | null {
  const value = readQuantity(cell, unit, mark, ['W', 'kW', 'dBW']);
  if (value === null || value < 0 || value > 100_000_000) return null;
  // Twelve digits: 0.1 kW is 100 W, not 100.00000000000001.
  return Number.isInteger(value) ? value : Number(value.toPrecision(12));
}
