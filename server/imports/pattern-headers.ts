import words from '../../datasets/import-headers.json' with { type: 'json' };
import type { ImportUnit } from '../../shared/contracts/list-import.ts';
import { splitUnit, unitOfWords } from './header-words.ts';
import { plainWords } from './plain-words.ts';

const prefixes = new Set(words.patterns.map(plainWords));
/** Fewer bearings than a quarter turn apart say too little of a pattern. */
const FEWEST = 4;
const MOST = 36;

/** A header such as "pattern_010", "az350" or "ERP 20° (kW)". */
export interface PatternHeader {
  readonly bearing: number;
  readonly unit: ImportUnit | null;
}

/** Bearing that a header names, in degrees from 0 to 359; null when it is no column of a pattern. */
export function readPatternHeader(header: string): PatternHeader | null {
  const { body, unit } = splitUnit(header);
  const match = /^(\p{L}[\p{L} ]*?) ?(\d{1,3})(?: (?:deg|degrees|grad|g))?(?: ([a-z]+))?$/u.exec(
    plainWords(body),
  );
  const [, prefix = '', digits = '', suffix = ''] = match ?? [];
  const suffixed = suffix === '' ? null : unitOfWords(suffix);
  const bearing = Number(digits);
  const isOne = prefixes.has(prefix) && bearing <= 360 && (suffix === '' || suffixed !== null);
  return match && isOne ? { bearing: bearing % 360, unit: unit ?? suffixed } : null;
}

/**
 * The columns of a pattern by their index; none where they are too few or too many, name a bearing
 * twice, or are numbered from 1 by 1, which leaves open where north is.
 */
export function patternColumns(headers: readonly string[]): ReadonlyMap<number, PatternHeader> {
  const found = new Map<number, PatternHeader>();
  headers.forEach((header, index) => {
    const read = readPatternHeader(header);
    if (read) found.set(index, read);
  });
  const bearings = new Set([...found.values()].map(({ bearing }) => bearing));
  const isFew = found.size < FEWEST || found.size > MOST || bearings.size < found.size;
  const isNumbered = found.size > FEWEST && Math.max(...bearings) <= found.size;
  return isFew || isNumbered ? new Map() : found;
}
