import words from '../../datasets/import-headers.json' with { type: 'json' };
import {
  type ImportField,
  importField,
  type ImportUnit,
  importUnit,
} from '../../shared/contracts/list-import.ts';

const fieldsByWord = index(words.fields, (name) => importField.parse(name));
const unitsByWord = index(words.units, (name) => importUnit.parse(name));

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
  const bracketed = /^(.*?)[([{]([^)\]}]*)[)\]}]\s*$/s.exec(header);
  const unit = bracketed ? unitsByWord.get(plainWords(bracketed[2] ?? '')) : undefined;
  if (bracketed && unit !== undefined) {
    return { field: fieldsByWord.get(plainWords(bracketed[1] ?? '')) ?? null, unit };
  }
  const text = plainWords(header);
  const whole = fieldsByWord.get(text);
  return whole === undefined ? readSuffixed(text.split(' ')) : { field: whole, unit: null };
}

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

/** Lower-case words without accents, punctuation or joined capitals. */
function plainWords(text: string): string {
  return text
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .replace(/\u0142/g, 'l')
    .replace(/\u00df/g, 'ss')
    .replace(/(\p{Ll})(\p{Lu})(?=\p{Ll}{2})/gu, '$1 $2')
    .toLowerCase()
    .replace(/(\p{L}{3,}?)(khz|mhz|hz|kw|dbw)$/u, '$1 $2')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

function index<T>(lists: Readonly<Record<string, readonly string[]>>, named: (key: string) => T) {
  const entries = Object.entries(lists).flatMap(([key, list]) =>
    list.map((word): [string, T] => [plainWords(word), named(key)]),
  );
  return new Map(entries);
}
