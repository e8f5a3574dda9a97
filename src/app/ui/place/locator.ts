import type { Place } from './place';

const LOCATOR = /^([A-R]{2})(\d{2})(?:([A-X]{2})(\d{2})?)?$/iu;

/** Longitude of one square at each level, degrees; latitude is half of it. */
const WIDTHS = [20, 2, 2 / 24, 2 / 240];

/**
 * Centre of the square that a Maidenhead locator of four, six or eight characters names; null when
 * the text is none.
 *
 * Source: the locator system of the IARU (Region 1 VHF Managers Handbook), from memory, not re-read.
 *
 * @example
 *   locatorCentre('JN58td'); // { latitude: 48.1458, longitude: 11.625 }, rounded
 */
export function locatorCentre(text: string): Place | null {
  const [, ...pairs] = LOCATOR.exec(text.trim()) ?? [];
  const levels = pairs.filter((pair): pair is string => (pair as string | undefined) !== undefined);
  if (levels.length === 0) return null;

  const half = (WIDTHS[levels.length - 1] ?? 0) / 2;
  return {
    longitude: round(reach(levels, 0) + half - 180),
    latitude: round(reach(levels, 1) / 2 + half / 2 - 90),
  };
}

/** How far the first (eastward) or second (northward, doubled) characters lead, degrees. */
function reach(levels: readonly string[], at: 0 | 1): number {
  return levels.reduce((sum, pair, level) => sum + rank(pair[at]) * (WIDTHS[level] ?? 0), 0);
}

/** A and 0 are 0, B and 1 are 1. */
function rank(character = ''): number {
  const value = Number.parseInt(character, 36);
  return value < 10 ? value : value - 10;
}

const round = (degrees: number): number => Number(degrees.toFixed(6));
