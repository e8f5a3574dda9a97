import { parse } from 'csv-parse/sync';

import type { DecimalMark } from './cell-number.ts';
import { csvOptions } from './csv-rows.ts';

const DELIMITERS = [',', ';', '\t', '|'] as const;
const SAMPLE_ROWS = 60;

/** Delimiter that takes most of the sample apart into rows of the same, largest width. */
export function detectDelimiter(sample: string): string {
  const widths = DELIMITERS.map((delimiter) => ({ delimiter, score: score(sample, delimiter) }));
  return widths.reduce((best, each) => (each.score > best.score ? each : best)).delimiter;
}

/** Share of rows of the commonest width; lines of title above the table are of another. */
function score(sample: string, delimiter: string): number {
  const widths = parseSample(sample, delimiter).map((row) => row.length);
  const width = commonest(widths.filter((each) => each > 1));
  if (width === null) return 0;
  const agreeing = widths.filter((each) => each === width).length;
  return (agreeing / widths.length) * 1000 + width;
}

/** The commonest of some widths; of equally common ones the first. */
export function commonest(widths: readonly number[]): number | null {
  const counts = new Map<number, number>();
  for (const width of widths) counts.set(width, (counts.get(width) ?? 0) + 1);
  const [best] = [...counts].sort(([, a], [, b]) => b - a);
  return best?.[0] ?? null;
}

function parseSample(sample: string, delimiter: string): string[][] {
  try {
    return parse(sample, { ...csvOptions(delimiter), to: SAMPLE_ROWS });
  } catch {
    return []; // A quotation mark that this delimiter leaves open: not the one.
  }
}

/** A decimal mark, and whether the cells leave no other. */
export interface FoundMark {
  readonly mark: DecimalMark;
  readonly sure: boolean;
}

/**
 * Decimal mark of a list's numbers. A mark followed by other than three digits, or standing behind
 * the other mark, can only be a decimal one; a mark that occurs twice in a number is none. Three
 * digits may be thousands: they count little, in a comma-separated file not at all, and leave the
 * answer unsure. Without evidence it is the point.
 */
export function detectDecimalMark(
  rows: readonly (readonly string[])[],
  delimiter: string,
): FoundMark {
  let sure = 0;
  let unsure = 0;
  let seen = false;
  for (const cell of rows.flat()) {
    const mark = markOf(cell);
    if (mark === null) continue;
    if (mark.sure) sure += mark.sign;
    else if (delimiter !== ',' || mark.sign < 0) unsure += mark.sign;
    seen ||= !mark.sure;
  }
  if (sure !== 0) return { mark: sure > 0 ? ',' : '.', sure: true };
  return { mark: unsure > 0 ? ',' : '.', sure: !seen };
}

const NUMBER = /^\s*[-+]?(\d[\d.,'\u2019 \u00a0\u2009\u202f]*)\s*[A-Za-z]*\s*$/;

/** What one number says of the decimal mark: above zero for the comma. */
function markOf(cell: string): { sign: 1 | -1; sure: boolean } | null {
  const digits = NUMBER.exec(cell)?.[1]?.trim() ?? '';
  const marks = digits.match(/[.,]/g) ?? [];
  const last = marks.at(-1);
  if (last === undefined) return null;
  const behind = digits.slice(digits.lastIndexOf(last) + 1);
  const sign = last === ',' ? 1 : -1;
  const before = marks.at(-2);
  // "48.1467, 11.6083" is two numbers.
  if (before !== last && marks.slice(0, -1).includes(last)) return null;
  if (before !== undefined && before !== last) return { sign, sure: true };
  // "46.58.48" is no number but degrees, minutes and seconds.
  const isGrouped = /^\d{1,3}(?:[.,]\d{3})+$/.test(digits);
  if (before === last) return isGrouped ? { sign: sign === 1 ? -1 : 1, sure: true } : null;
  return {
    sign,
    sure: !/^\d{3}$/.test(behind) || /^0[.,]/.test(digits) || /^\d{4,}[.,]/.test(digits),
  };
}
