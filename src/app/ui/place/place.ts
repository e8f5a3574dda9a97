import { locatorCentre } from '../../../../shared/radio/propagation/locator';
import type { Place } from '../../../../shared/radio/propagation/path';
import { type Axis, formatCoordinate, parseCoordinate } from './coordinate';

export type PlaceReading = { readonly place: Place | null } | { readonly problem: string };

/** Four characters or more: two name a square as large as a country. */
const LOCATOR = /^[A-R]{2}\d{2}(?:[A-X]{2}(?:\d{2})?)?$/iu;
const HEMISPHERE_BETWEEN = /^(.*[NS])[\s,;/]*(.*[EW])$|^([NS].*?)[\s,;/]*([EW].*)$/isu;

/** Reads a pair of coordinates, latitude first, or a Maidenhead locator. */
export function parsePlace(text: string): PlaceReading {
  const plain = text.replaceAll('º', '°').normalize('NFKC').trim();
  if (plain === '') return { place: null };
  if (LOCATOR.test(plain)) return { place: centreOf(plain) };

  const [north, east] = splitPair(plain);
  if (north === undefined || east === undefined) return { problem: expected() };
  const latitude = parseCoordinate(north, 'latitude');
  const longitude = parseCoordinate(east, 'longitude');
  if ('problem' in latitude) return latitude;
  if ('problem' in longitude) return longitude;
  if (latitude.value === null || longitude.value === null) return { problem: expected() };
  return { place: { latitude: latitude.value, longitude: longitude.value } };
}

/** Writes a place as people read it; a place that is not known is a dash. */
export function formatPlace(latitude: number | null, longitude: number | null): string {
  if (latitude === null || longitude === null) return '–';
  const write = (degrees: number, axis: Axis) => formatCoordinate(degrees, axis);
  return `${write(latitude, 'latitude')}, ${write(longitude, 'longitude')}`;
}

/** Centre of a locator's square, to the metre. */
function centreOf(locator: string): Place {
  const { latitude, longitude } = locatorCentre(locator);
  return { latitude: Number(latitude.toFixed(5)), longitude: Number(longitude.toFixed(5)) };
}

/** Parts at the letter between the two, at a semicolon or slash, at ", ", else at the one comma or space. */
function splitPair(text: string): (string | undefined)[] {
  const [, ...found] = HEMISPHERE_BETWEEN.exec(text) ?? [];
  const lettered = found.filter((part) => (part as string | undefined) !== undefined);
  if (lettered.length === 2) return lettered;
  for (const mark of [/\s*[;/]\s*/u, /\s*,\s+/u, /,/u, /\s+/u]) {
    const parts = text.split(mark);
    if (parts.length === 2) return parts;
  }
  return [];
}

function expected(): string {
  return $localize`Give a pair such as 48.2 N, 16.4 E, or a locator such as JN88ee.`;
}
