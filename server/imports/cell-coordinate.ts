import type { ImportUnit, LetterO } from '../../shared/contracts/list-import.ts';
import { type Axis, hemisphereSign } from './cell-hemisphere.ts';
import { type DecimalMark, readNumber } from './cell-number.ts';

const LIMITS: Readonly<Record<Axis, number>> = { latitude: 90, longitude: 180 };
/** The last letter of "48d12m30s" means seconds, not the south; that of "48d12m30S" the south. */
const MARK_OF_SECONDS = /(?:(m\s*[\d.,]+)s|(M\s*[\d.,]+)S)(?=\s*[NSEWnsew]?$)/;
const UNIT_BEFORE = /^(?:d|m|s|deg|min|sec|g)\.?\s+(?=\p{L})/iu;
const UNIT_WORDS = /^(?:d|m|s|deg|min|sec|g)\.?$/i;
/** "011E3045": the letter of the hemisphere between degrees and minutes, as in notices to the ITU. */
const LETTER_INSIDE = /^(\d{2,3})\s*([NSEWO])\s*(\d{2})\s*(\d{2}(?:[.,]\d+)?)?$/i;
const PACKED_SECONDS = /^(\d{2,3})(\d{2})(\d{2}(?:[.,]\d+)?)$/;
const PACKED_MINUTES: Readonly<Record<Axis, RegExp>> = {
  latitude: /^(\d{2})(\d{2})$/,
  longitude: /^(\d{3})(\d{2})$/,
};
const PART_MARKS = new RegExp(
  '\\s*(?:[\\u00b0\\u00ba\\u02da\'\\u2018\\u2019\\u201b\\u00b4`\\u2032"\\u201c\\u201d\\u2033:]' +
    '|deg|min|sec|[dms])+\\.?\\s*|\\s+|-',
  'iu',
);

/** How the coordinates of a file are written. */
export interface CoordinateSpelling {
  readonly unit: ImportUnit | null;
  readonly mark: DecimalMark;
  readonly letterO?: LetterO;
}

/**
 * Decimal degrees, north and east positive; null when the cell is no coordinate of this axis.
 *
 * Read are signed decimals, a hemisphere's letter or word before, behind or between, and degrees,
 * minutes and seconds apart by their signs, colons, spaces, points or hyphens. Digits without a
 * break (DDMMSS) are only read so with a hemisphere or where the column's unit says dms.
 */
export function readCoordinate(
  cell: string,
  axis: Axis,
  { unit, mark, letterO = null }: CoordinateSpelling,
): number | null {
  const plain = unit === 'dms' ? null : readNumber(cell, mark);
  // "11E36" is 11 degrees 36 minutes east, no power of ten.
  if (plain !== null && !/e/i.test(cell)) return Math.abs(plain) <= LIMITS[axis] ? plain : null;
  const text = cell.trim().replace('\u2212', '-').replace(MARK_OF_SECONDS, '$1$2');
  const inside = LETTER_INSIDE.exec(text);
  const { body, word, minus } = inside ? joined(inside) : split(text, axis);
  const sign = word === null ? (minus ? -1 : 1) : hemisphereSign(word, axis, letterO);
  if (sign === null || (word !== null && minus)) return null;
  const magnitude = readMagnitude(body, axis, word !== null, unit, mark);
  if (magnitude === null || magnitude > LIMITS[axis]) return null;
  const degrees = sign * magnitude;
  return Object.is(degrees, -0) ? 0 : Number(degrees.toFixed(7));
}

interface Split {
  readonly body: string;
  /** Hemisphere's letter or word; null where there is none, empty where there are two. */
  readonly word: string | null;
  readonly minus: boolean;
}

const joined = ([, degrees = '', letter = '', minutes = '', seconds = '']: string[]): Split => ({
  body: `${degrees} ${minutes} ${seconds}`.trim(),
  word: letter,
  minus: false,
});

function split(text: string, axis: Axis): Split {
  const before = /^\p{L}[\p{L}.\s]*/u.exec(text)?.[0] ?? '';
  const rest = text.slice(before.length);
  const words = /(?<![\p{L}])\p{L}[\p{L}.\s]*$/u.exec(rest)?.[0] ?? '';
  const behind =
    hemisphereSign(words, axis, 'open') === null ? words.replace(UNIT_BEFORE, '') : words;
  const after = UNIT_WORDS.test(behind.trim()) && behind.trim() !== 'S' ? '' : behind;
  const inner = rest.slice(0, rest.length - after.length).trim();
  const word = before !== '' && after !== '' ? '' : before || after || null;
  return { body: inner.replace(/^[-+]\s*/, ''), word, minus: inner.startsWith('-') };
}

function readMagnitude(
  body: string,
  axis: Axis,
  isLettered: boolean,
  unit: ImportUnit | null,
  mark: DecimalMark,
): number | null {
  if (isLettered || unit === 'dms') {
    const packed =
      PACKED_SECONDS.exec(body) ?? (isLettered ? PACKED_MINUTES[axis].exec(body) : null);
    if (packed) return joinParts(packed.slice(1), mark);
  }
  const isDotted = /^\d{1,3}\.\d{1,2}\.\d{1,2}$/.test(body);
  const parts = body.split(isDotted ? '.' : PART_MARKS).filter((part) => part !== '');
  if (parts.length > 1) return joinParts(parts, mark);
  // One number under "dms" would be whole degrees: minutes lost, or digits meant otherwise.
  if (unit === 'dms' && !/[\u00b0\u00ba\u02dad]/i.test(body)) return null;
  return unsigned(parts[0], mark);
}

/** Degrees, minutes and seconds; only the last part may be broken. */
function joinParts(parts: readonly string[], mark: DecimalMark): number | null {
  if (parts.length > 3) return null;
  const values = parts.map((part) => unsigned(part, mark));
  const [degrees, minutes = 0, seconds = 0] = values;
  if (typeof degrees !== 'number' || minutes === null || seconds === null) return null;
  const areWhole = values.slice(0, -1).every((value) => Number.isInteger(value));
  if (!areWhole || minutes >= 60 || seconds >= 60) return null;
  return degrees + minutes / 60 + seconds / 3600;
}

function unsigned(text: string | undefined, mark: DecimalMark): number | null {
  if (text === undefined || !/^\d/.test(text)) return null;
  return readNumber(text, mark);
}
