import type { ImportUnit } from '../../shared/contracts/list-import.ts';
import { type DecimalMark, readNumber } from './cell-number.ts';

export type Axis = 'latitude' | 'longitude';

const LIMITS: Readonly<Record<Axis, number>> = { latitude: 90, longitude: 180 };
const HEMISPHERES: Readonly<Record<Axis, Readonly<Record<string, 1 | -1>>>> = {
  latitude: { N: 1, S: -1 },
  longitude: { E: 1, W: -1 },
};
/** The last letter of "48d12m30s" means seconds, not the south; that of "48d12m30S" the south. */
const MARK_OF_SECONDS = /(?:(m\s*[\d.,]+)s|(M\s*[\d.,]+)S)(?=\s*[NSEWnsew]?$)/;

/**
 * Decimal degrees, north and east positive; null when the cell is no coordinate of this axis.
 *
 * Read are signed decimals, a hemisphere's letter before or behind, and degrees, minutes and seconds
 * apart by their signs, colons, spaces or hyphens. Digits without a break (DDMMSS) are only read so
 * where the column's unit says dms.
 */
export function readCoordinate(
  cell: string,
  axis: Axis,
  unit: ImportUnit | null,
  mark: DecimalMark,
): number | null {
  const plain = unit === 'dms' ? null : readNumber(cell, mark);
  if (plain !== null) return Math.abs(plain) <= LIMITS[axis] ? plain : null;
  const text = cell.trim().replace('\u2212', '-').replace(MARK_OF_SECONDS, '$1$2');
  const { body, sign } = splitHemisphere(text, axis);
  if (sign === null) return null;
  const magnitude = readMagnitude(body, unit, mark);
  if (magnitude === null || magnitude > LIMITS[axis]) return null;
  const degrees = sign * magnitude;
  return Object.is(degrees, -0) ? 0 : Number(degrees.toFixed(7));
}

interface Split {
  readonly body: string;
  /** Null: letter of the other axis, or a letter and a sign at once. */
  readonly sign: 1 | -1 | null;
}

function splitHemisphere(text: string, axis: Axis): Split {
  const match = /^([NSEW])?\s*([-+])?(.*?)\s*([NSEW])?$/is.exec(text);
  const [, before, signMark, body = '', after] = match ?? [];
  const letter = (before ?? after)?.toUpperCase();
  if (letter === undefined) return { body, sign: signMark === '-' ? -1 : 1 };
  const isSingle = before === undefined || after === undefined;
  const sign = HEMISPHERES[axis][letter];
  return { body, sign: isSingle && signMark === undefined ? (sign ?? null) : null };
}

function readMagnitude(body: string, unit: ImportUnit | null, mark: DecimalMark): number | null {
  const packed = /^(\d{2,3})(\d{2})(\d{2}(?:[.,]\d+)?)$/.exec(body);
  if (unit === 'dms' && packed) return joinParts(packed.slice(1), mark);
  const parts = body.split(/\s*[\u00b0\u00ba'\u2032\u2019"\u2033\u201d:dms]+\s*|\s+|-/i);
  const filled = parts.filter((part) => part !== '');
  if (filled.length > 1) return joinParts(filled, mark);
  // One number under "dms" would be whole degrees: minutes lost, or digits meant otherwise.
  if (unit === 'dms' && !/[\u00b0\u00bad]/i.test(body)) return null;
  return unsigned(filled[0], mark);
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
