/**
 * A transmitter of an allocation list, as the engine computes with it.
 *
 * @module radio/station
 */

import type { PathSection } from './propagation/mixed-path.ts';

/** One station. What is null was not given. */
export interface Station {
  /** Index in the list that was sent, or the station's id in an edition. */
  readonly id: number;
  readonly name: string;
  readonly frequencyHz: number;
  readonly latitude: number | null;
  readonly longitude: number | null;
  /** Effective monopole-radiated power by day, watts; 0: silent. */
  readonly powerDayW: number | null;
  /** Effective monopole-radiated power by night, watts; 0: silent. */
  readonly powerNightW: number | null;
  /** Field at the site, dB(uV/m), when it is known; nothing is computed then. */
  readonly fieldDb: number | null;
  /** Grounds of the path from the station to the site; otherwise the site's throughout. */
  readonly path?: readonly PathSection[] | null;
  /** Gains of the aerial, dB, every 10 degrees from north; otherwise the same all round. */
  readonly patternDb?: readonly number[] | null;
  /** Found silent by somebody who listened; it has no field then. */
  readonly offAir?: boolean;
}

/** A part of the spectrum divided into equal channels. */
export interface RasterRange {
  readonly lowHz: number;
  readonly highHz: number;
  readonly stepHz: number;
}
