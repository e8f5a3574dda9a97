import { commonest } from './csv-detection.ts';
import type { CsvRow } from './csv-rows.ts';
import { readHeader, unitOfWords } from './header-words.ts';
import { readPatternHeader } from './pattern-headers.ts';

/** Where the table of a file begins. */
export interface HeaderPlace {
  readonly headers: readonly string[];
  readonly headerLine: number;
  /** The first line of the rows, which a line of units may part from the headers. */
  readonly dataLine: number;
  /** The rows of the sample, without what stands above them. */
  readonly rows: readonly CsvRow[];
}

/** Titles are short; what comes later is a table that has no header we know. */
const LOOKED_AT = 40;
const HEADER_CHARACTERS = 200;

/**
 * Finds the row of column headers: the one with the most words that are known as headers, else the
 * first row as wide as most are. Null for a file of no rows.
 */
export function findHeader(sample: readonly CsvRow[]): HeaderPlace | null {
  const scores = sample.slice(0, LOOKED_AT).map(({ cells }) => knownHeaders(cells));
  const best = Math.max(...scores);
  const width = commonest(sample.map(({ cells }) => cells.length));
  const at =
    best > 0 ? scores.indexOf(best) : sample.findIndex(({ cells }) => cells.length === width);
  const header = sample[at];
  if (!header) return null;
  const names = header.cells.map((cell) => cell.trim().slice(0, HEADER_CHARACTERS));
  const units = sample[at + 1];
  const hasUnits = units !== undefined && isUnits(units.cells);
  const rows = sample.slice(at + (hasUnits ? 2 : 1));
  return {
    headers: hasUnits ? names.map((name, index) => joined(name, units.cells[index])) : names,
    headerLine: header.line,
    dataLine: rows[0]?.line ?? Infinity,
    rows,
  };
}

/** How many different things the cells name as headers of a list do. */
function knownHeaders(cells: readonly string[]): number {
  const fields = new Set(cells.map((cell) => readHeader(cell).field));
  fields.delete(null);
  return fields.size + (cells.some((cell) => readPatternHeader(cell) !== null) ? 1 : 0);
}

/** Whether a row under the headers only names units. */
function isUnits(cells: readonly string[]): boolean {
  const said = cells.map((cell) => cell.trim().replace(/^[([{]|[)\]}]$/g, '')).filter(Boolean);
  return said.length > 0 && said.every((cell) => !/\d/.test(cell) && unitOfWords(cell) !== null);
}

function joined(name: string, unit = ''): string {
  const plain = unit.trim().replace(/^[([{]|[)\]}]$/g, '');
  return plain === '' ? name : `${name} (${plain})`;
}
