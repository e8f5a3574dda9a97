import type { Place } from '../../../../shared/radio/propagation/path';

/** How a station is drawn: as it should be, off the raster, or off the air. */
export type StationLook = 'plain' | 'off-raster' | 'off-air';

/** A station as a map draws it. */
export interface MapStation extends Place {
  readonly id: string;
  readonly name: string;
  /** By what it is sized, in decibels; null: not known. */
  readonly level: number | null;
  readonly look: StationLook;
}

/** What the sizes of the marks mean. */
export interface SizeScale {
  /** Level of the smallest mark. */
  readonly lowDb: number;
  /** Level of the largest. */
  readonly highDb: number;
  /** Levels shown beneath the map, with their words. */
  readonly samples: readonly { readonly level: number; readonly text: string }[];
  /** What is sized, such as "Field at the site". */
  readonly title: string;
}

const SMALLEST = 2.5;
const LARGEST = 8.5;

/** Radius of a mark, CSS pixels; what is not known is drawn smallest. */
export function markRadius(level: number | null, { lowDb, highDb }: SizeScale): number {
  const share = level === null ? 0 : (level - lowDb) / (highDb - lowDb);
  return SMALLEST + (LARGEST - SMALLEST) * Math.min(1, Math.max(0, share));
}
