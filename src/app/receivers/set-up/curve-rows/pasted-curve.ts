import { parseQuantity } from '../../../ui/quantity/quantity';

export interface CurvePoint {
  readonly offsetHz: number;
  readonly rejectionDb: number;
}

/** What was pasted: points from the middle outwards, and the lines that are none. */
export interface PastedCurve {
  readonly points: readonly CurvePoint[];
  /** Counted from 1, a heading on top left out. */
  readonly unread: readonly number[];
}

/**
 * Reads two columns as a spreadsheet copies them: distance from the middle and level. Distances are
 * kHz unless they, or a heading, say otherwise. Levels count downwards whatever their sign, and the
 * two sides of a curve are averaged where both are there.
 *
 * @returns Null for a text that is no table.
 */
export function pastedCurve(text: string): PastedCurve | null {
  const lines = text
    .split(/\r?\n/u)
    .map((line) => line.trim())
    .filter((line) => line !== '');
  const rows = lines.map(cellsOf);
  if (!rows.some((row) => row.length > 1)) return null;

  const unread: number[] = [];
  const inHertz = /\bhz\b/iu.test(rows[0]?.[0] ?? '') && pointOf(rows[0] ?? [], false) === null;
  const levels = new Map<number, number[]>();
  rows.forEach((row, index) => {
    const point = pointOf(row, inHertz);
    if (point)
      levels.set(point.offsetHz, [...(levels.get(point.offsetHz) ?? []), point.rejectionDb]);
    else if (index > 0) unread.push(index + 1);
  });
  const points = [...levels]
    .sort(([one], [other]) => one - other)
    .map(([offsetHz, all]) => ({
      offsetHz,
      rejectionDb: all.reduce((sum, level) => sum + level, 0) / all.length,
    }));
  return { points, unread };
}

/** Cells stand between tabs or semicolons, or between blanks that no number has inside. */
const cellsOf = (line: string): string[] =>
  (/[\t;]/u.test(line) ? line.split(/[\t;]/u) : line.split(/\s+(?=[-+−\d])/u)).map((cell) =>
    cell.trim(),
  );

function pointOf(
  [offset = '', level = '']: readonly string[],
  inHertz: boolean,
): CurvePoint | null {
  const hz = valueOf(offset, inHertz ? 'tone' : 'frequency');
  const db = valueOf(level, 'decibels');
  return hz === null || db === null ? null : { offsetHz: Math.abs(hz), rejectionDb: Math.abs(db) };
}

function valueOf(text: string, quantity: Parameters<typeof parseQuantity>[1]): number | null {
  const reading = parseQuantity(text, quantity);
  return 'value' in reading ? reading.value : null;
}
