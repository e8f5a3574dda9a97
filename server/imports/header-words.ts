import words from '../../datasets/import-headers.json' with { type: 'json' };
import {
  type ImportField,
  importField,
  type ImportUnit,
  importUnit,
} from '../../shared/contracts/list-import.ts';
import { meaningsByWord, plainWords } from './plain-words.ts';

const fieldsByWord = meaningsByWord(words.fields, (name) => importField.parse(name));
const unitsByWord = meaningsByWord(words.units, (name) => importUnit.parse(name));

/** A header taken apart: what the column holds and in which unit, as far as the words tell. */
export interface ReadHeader {
  readonly field: ImportField | null;
  readonly unit: ImportUnit | null;
}

/**
 * Reads a column's header by the synonyms of the data file; a unit may stand in brackets or as the
 * last words: "Power day (kW)", "power_day_kw", "Frequency [MHz]".
 */
export function readHeader(header: string): ReadHeader {
  const { body, unit } = splitUnit(header);
  if (unit !== null) return { field: fieldsByWord.get(plainWords(body)) ?? null, unit };
  const text = plainWords(header);
  const whole = fieldsByWord.get(text);
  return whole === undefined ? readSuffixed(text.split(' ')) : { field: whole, unit: null };
}

/** A unit in brackets at the end of a header, and what stands before it. */
export function splitUnit(header: string): { body: string; unit: ImportUnit | null } {
  const [, body = header, inner = ''] = /^([^([{]*)[([{]([^)\]}]*)[)\]}]\s*$/.exec(header) ?? [];
  return { body, unit: unitOfWords(inner) };
}

/** The unit that words name; null when they name none. */
export const unitOfWords = (text: string): ImportUnit | null =>
  unitsByWord.get(plainWords(text)) ?? null;

function readSuffixed(all: readonly string[]): ReadHeader {
  for (let from = 1; from < all.length; from++) {
    const unit = unitsByWord.get(all.slice(from).join(' '));
    const field = fieldsByWord.get(all.slice(0, from).join(' '));
    if (unit !== undefined && field !== undefined) return { field, unit };
  }
  const unit = unitsByWord.get(all.join(' '));
  // A header that is only "kHz" or "kW" names its quantity by the unit.
  return unit === undefined ? { field: null, unit: null } : { field: quantityOf(unit), unit };
}

function quantityOf(unit: ImportUnit): ImportField | null {
  if (unit === 'Hz' || unit === 'kHz' || unit === 'MHz') return 'frequency';
  return unit === 'W' || unit === 'kW' || unit === 'dBW' ? 'power' : null;
}
