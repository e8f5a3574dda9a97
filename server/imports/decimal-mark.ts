import { readCoordinate } from './cell-coordinate.ts';
import { type DecimalMark, isBlank } from './cell-number.ts';
import { readFrequency, readPower } from './cell-unit.ts';
import { detectDecimalMark, type FoundMark } from './csv-detection.ts';
import { proposeColumns } from './column-matching.ts';
import type { ImportColumn } from '../../shared/contracts/list-import.ts';

/** Frequencies of broadcasting and beacons: what a list of them is likely to hold. */
const LIKELY_HZ = [10_000, 30_000_000] as const;

/**
 * Decimal mark of a table. Where its numbers alone leave it open ("1.359" may be either), the mark
 * is taken by which more cells make sense as the frequency or place that their column names.
 */
export function findDecimalMark(
  headers: readonly string[],
  rows: readonly (readonly string[])[],
  delimiter: string,
): FoundMark {
  const found = detectDecimalMark(rows, delimiter);
  if (found.sure) return found;
  const columns = proposeColumns(headers, rows, found.mark);
  const sense = (mark: DecimalMark) => sensible(columns, rows, mark);
  const [point, comma] = [sense('.'), sense(',')];
  if (point === comma) return found;
  return { mark: comma > point ? ',' : '.', sure: true };
}

function sensible(
  columns: readonly ImportColumn[],
  rows: readonly (readonly string[])[],
  mark: DecimalMark,
): number {
  let count = 0;
  columns.forEach((column, index) => {
    for (const row of rows) {
      const cell = row[index] ?? '';
      if (!isBlank(cell) && makesSense(cell, column, mark)) count += 1;
    }
  });
  return count;
}

function makesSense(cell: string, { field, unit }: ImportColumn, mark: DecimalMark): boolean {
  if (field === 'latitude' || field === 'longitude') {
    return readCoordinate(cell, field, { unit, mark }) !== null;
  }
  if (field === 'frequency' && unit !== null) {
    const hertz = readFrequency(cell, unit, mark);
    return hertz !== null && hertz >= LIKELY_HZ[0] && hertz <= LIKELY_HZ[1];
  }
  const isPower = field === 'power' || field === 'powerDay' || field === 'powerNight';
  return isPower && unit !== null && readPower(cell, unit, mark) !== null;
}
