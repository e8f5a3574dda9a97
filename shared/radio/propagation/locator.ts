/**
 * Maidenhead locators: places as short texts, in use among amateurs.
 *
 * @module radio/propagation/locator
 */
import type { Place } from './path.ts';

/** Pairs of characters: how many steps each divides a square into, and its first character. */
const PAIRS = [
  { steps: 18, first: 'A' },
  { steps: 10, first: '0' },
  { steps: 24, first: 'a' },
  { steps: 10, first: '0' },
] as const;

const LOCATOR = /^[A-R]{2}(?:[0-9]{2}(?:[A-X]{2}(?:[0-9]{2})?)?)?$/i;

/**
 * Centre of the square a locator names.
 *
 * Source: IARU Region 1 VHF Managers' Handbook, from memory, not re-read.
 *
 * @param locator 2, 4, 6 or 8 characters, capital or small.
 * @returns The centre, degrees.
 * @throws {RangeError} If the text is not a locator.
 * @example
 *   locatorCentre('JN58td'); // { latitude: 48.1458, longitude: 11.625 }
 */
export function locatorCentre(locator: string): Place {
  if (!LOCATOR.test(locator)) {
    throw new RangeError(`expected a locator such as JN58 or JN58td, got "${locator}"`);
  }
  let [longitude, latitude, width] = [-180, -90, 360];
  for (let at = 0; at < locator.length; at += 2) {
    width /= PAIRS[at / 2]?.steps ?? 1;
    longitude += width * digit(locator, at);
    latitude += (width / 2) * digit(locator, at + 1);
  }
  return { latitude: latitude + width / 4, longitude: longitude + width / 2 };
}

/**
 * Locator of a place, six characters.
 *
 * Source: IARU Region 1 VHF Managers' Handbook, from memory, not re-read.
 *
 * @param place The place; latitude -90 to 90, longitude -180 to 180.
 * @returns The locator.
 * @throws {RangeError} If a coordinate is out of range.
 * @example
 *   locator({ latitude: 48.14666, longitude: 11.60833 }); // 'JN58td'
 */
export function locator({ latitude, longitude }: Place): string {
  if (!(Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180)) {
    throw new RangeError(`expected degrees on the earth, got ${latitude}, ${longitude}`);
  }
  // The north pole and the date line belong to the last square, not to one beyond it.
  let east = Math.min((longitude + 180) / 360, 1 - Number.EPSILON);
  let north = Math.min((latitude + 90) / 180, 1 - Number.EPSILON);
  let text = '';
  for (const { steps, first } of PAIRS.slice(0, 3)) {
    for (const part of [east, north]) {
      text += String.fromCharCode(first.charCodeAt(0) + Math.floor(part * steps));
    }
    [east, north] = [(east * steps) % 1, (north * steps) % 1];
  }
  return text;
}

/** Digit that a character of a locator stands for: letters from 0 up, digits as they are. */
function digit(text: string, at: number): number {
  const value = parseInt(text.charAt(at), 36);
  return value < 10 ? value : value - 10;
}
