/**
 * Harmonics of an IF against the channels of the bands they fall on.
 *
 * Source: arithmetic.
 *
 * @module radio/candidates/harmonics-on-channels
 */
import { ifHarmonics } from '../mixing/harmonic-whistles.ts';
import { rasterChannels } from '../channels/raster.ts';
import type { Band } from '../receiver.ts';
import { lowerBound } from '../channels/spectrum.ts';
import type { RasterRange } from '../station.ts';

/** A harmonic of the IF on a band, with the channel it whistles on. */
export interface HarmonicOnChannel {
  readonly harmonic: number;
  readonly dialHz: number;
  /** Nearest channel of the raster in the band; null: the band has none. */
  readonly channelHz: number | null;
  readonly beatHz: number | null;
}

/**
 * The 2nd to 8th harmonics of an IF that fall on a band, each once, with the nearest channel that
 * the band tunes, of two equally near the lower.
 *
 * @param ifHz The IF, hertz.
 * @param bands The bands of the receiver.
 * @param raster Ranges of the raster.
 * @returns The harmonics, ascending.
 *
 * @example
 *   const bands = [{ lowHz: 520_000, highHz: 1_710_000 }];
 *   harmonicsOnChannels(455_000, bands, defaultRaster(1)).map(({ beatHz }) => beatHz); // [1000, 3000]
 */
export function harmonicsOnChannels(
  ifHz: number,
  bands: readonly Pick<Band, 'lowHz' | 'highHz'>[],
  raster: readonly RasterRange[],
): HarmonicOnChannel[] {
  const found = new Map<number, HarmonicOnChannel>();
  for (const { lowHz, highHz } of bands) {
    const channels = rasterChannels(raster, lowHz, highHz);
    for (const { harmonic, dialHz } of ifHarmonics(ifHz, lowHz, highHz)) {
      const channelHz = nearestOf(channels, dialHz);
      const beatHz = channelHz === null ? null : Math.abs(dialHz - channelHz);
      const known = found.get(harmonic)?.beatHz ?? null;
      if (known !== null && (beatHz === null || beatHz >= known)) continue;
      found.set(harmonic, { harmonic, dialHz, channelHz, beatHz });
    }
  }
  return [...found.values()].sort((a, b) => a.harmonic - b.harmonic);
}

/**
 * Beat of the harmonic that comes nearest to a channel.
 *
 * @param harmonics The harmonics of one IF.
 * @returns Hertz; Infinity when none meets a channel.
 *
 * @example
 *   nearestWhistle([]); // Infinity
 */
export function nearestWhistle(harmonics: readonly HarmonicOnChannel[]): number {
  return harmonics.reduce((least, { beatHz }) => Math.min(least, beatHz ?? Infinity), Infinity);
}

function nearestOf(channels: readonly number[], hz: number): number | null {
  const above = lowerBound(channels, hz);
  const [lower, upper] = [channels[above - 1], channels[above]];
  if (lower === undefined) return upper ?? null;
  if (upper === undefined) return lower;
  return hz - lower <= upper - hz ? lower : upper;
}
