import type { LetterO } from '../../shared/contracts/list-import.ts';
import { readCoordinate } from './cell-coordinate.ts';
import type { DecimalMark } from './cell-number.ts';

/** A place on the earth, in degrees north and east. */
export interface ReadPlace {
  readonly latitude: number;
  readonly longitude: number;
}

interface Halves {
  readonly place: ReadPlace;
  /** Whether more than a space parts them, or both are told in the same number of figures. */
  readonly isClear: boolean;
}

/** Longer text is no place; each break within it is tried. */
const LONGEST = 80;
const BREAKS =
  /[\s,;/|]+|(?<=\p{L})(?=[-+\d])|(?<=[^\p{L}\s,;/|])(?=\p{L})|(?<=[\d.,'"\u2032\u2033\u2019\u201d]\p{L})(?=\p{L})/gu;
const OTHER = { '.': ',', ',': '.' } as const;

/**
 * Both coordinates in one cell, such as `48°08'48"N 011°36'30"E`, "48.1467, 11.6083", "48N08 11E36"
 * or "N480848E0113630"; the latitude first unless letters say otherwise. Null for other text, and
 * where it can be parted in two ways. Such a cell may have another decimal mark than the file.
 */
export function readPlace(cell: string, mark: DecimalMark, letterO: LetterO): ReadPlace | null {
  const text = cell.trim().replace(/^[([]\s*(.*?)\s*[)\]]$/, '$1');
  if (text.length > LONGEST) return null;
  return partedPlace(text, mark, letterO) ?? partedPlace(text, OTHER[mark], letterO);
}

function partedPlace(text: string, mark: DecimalMark, letterO: LetterO): ReadPlace | null {
  const all = [...text.matchAll(BREAKS)].flatMap(({ 0: gap, index }) => {
    const [before, behind] = [text.slice(0, index), text.slice(index + gap.length)];
    const place = asPlace(before, behind, mark, letterO) ?? turned(before, behind, mark, letterO);
    if (!place) return [];
    const isClear = /[,;/|]/.test(gap) || figures(before) === figures(behind);
    return [{ place, isClear }];
  });
  return onlyOne(all) ?? onlyOne(all.filter(({ isClear }) => isClear));
}

function onlyOne(halves: readonly Halves[]): ReadPlace | null {
  const [first, ...others] = halves.map(({ place }) => place);
  const isSame = ({ latitude, longitude }: ReadPlace) =>
    latitude === first?.latitude && longitude === first.longitude;
  return first !== undefined && others.every(isSame) ? first : null;
}

const figures = (text: string): number => text.match(/\d+/g)?.length ?? 0;

function asPlace(
  north: string,
  east: string,
  mark: DecimalMark,
  letterO: LetterO,
): ReadPlace | null {
  const latitude = readCoordinate(north, 'latitude', { unit: null, mark, letterO });
  if (latitude === null) return null;
  const longitude = readCoordinate(east, 'longitude', { unit: null, mark, letterO });
  return longitude === null ? null : { latitude, longitude };
}

/** The longitude first: only where letters say so. */
const turned = (
  east: string,
  north: string,
  mark: DecimalMark,
  letterO: LetterO,
): ReadPlace | null =>
  /\p{L}/u.test(east) && /\p{L}/u.test(north) ? asPlace(north, east, mark, letterO) : null;
