import { parse } from 'csv-parse/sync';

import { csvOptions } from './csv-rows.ts';

const DELIMITERS = [',', ';', '\t', '|'] as const;
const SAMPLE_ROWS = 50;

/** Delimiter that takes most of the sample apart into rows of the same, largest width. */
export function detectDelimiter(sample: string): string {
  const widths = DELIMITERS.map((delimiter) => ({ delimiter, score: score(sample, delimiter) }));
  return widths.reduce((best, each) => (each.score > best.score ? each : best)).delimiter;
}

function score(sample: string, delimiter: string): number {
  const [header, ...rows] = parseSample(sample, delimiter);
  const width = header?.length ?? 0;
  if (width < 2) return 0;
  const agreeing = rows.filter((row) => row.length === width).length;
  return (rows.length === 0 ? 1 : agreeing / rows.length) * 1000 + width;
}

function parseSample(sample: string, delimiter: string): string[][] {
  try {
    return parse(sample, { ...csvOptions(delimiter), to: SAMPLE_ROWS });
  } catch {
    return []; // A quotation mark that this delimiter leaves open: not the one.
  }
}

/**
 * Decimal mark of a list's numbers. A mark followed by other than three digits can only be a decimal
 * one. Three digits may be thousands, so they count little, and in a comma-separated file not at
 * all. Without evidence it is the point.
 */
export function detectDecimalMark(
  rows: readonly (readonly string[])[],
  delimiter: string,
): '.' | ',' {
  let commas = 0;
  for (const cell of rows.flat()) {
    const match = /^\s*[-+]?\d+([.,])(\d+)\s*[A-Za-z]*\s*$/.exec(cell);
    if (!match) continue;
    const weight = match[2]?.length !== 3 ? 10 : delimiter === ',' ? 0 : 1;
    commas += match[1] === ',' ? weight : -weight;
  }
  return commas > 0 ? ',' : '.';
}
