/**
 * Channel rasters: where the stations of a region lie, and the guard bands midway between them.
 *
 * A raster is dated data that people may edit; the defaults here are what the ITU Regions plan by.
 *
 * Source: ITU-R Final Acts GE75 (9 kHz in Regions 1 and 3) and RJ81 (10 kHz in Region 2), from
 * memory, not re-read; the rest is arithmetic.
 *
 * @module radio/channels/raster
 */
import type { ItuRegion } from '../site.ts';
import type { RasterRange } from '../station.ts';

const LONG_WAVE_9: RasterRange = { lowHz: 153_000, highHz: 279_000, stepHz: 9_000 };
const MEDIUM_WAVE_9: RasterRange = { lowHz: 531_000, highHz: 1_602_000, stepHz: 9_000 };
const MEDIUM_WAVE_10: RasterRange = { lowHz: 540_000, highHz: 1_700_000, stepHz: 10_000 };

/**
 * Broadcast raster of an ITU Region where none has been entered.
 *
 * Regions 1 and 3: 153 to 279 kHz (15 channels) and 531 to 1602 kHz (120 channels) by 9 kHz, the
 * GE75 plan in force since 23 November 1978. Region 2: 540 to 1700 kHz by 10 kHz (117 channels).
 * Single channels beyond (530, 1611 kHz) are in use in places.
 *
 * @param ituRegion ITU Region 1, 2 or 3.
 * @returns The ranges, ascending.
 * @example
 *   defaultRaster(2); // [{ lowHz: 540000, highHz: 1700000, stepHz: 10000 }]
 */
export function defaultRaster(ituRegion: ItuRegion): RasterRange[] {
  return ituRegion === 2 ? [MEDIUM_WAVE_10] : [LONG_WAVE_9, MEDIUM_WAVE_9];
}

/**
 * Channels of a raster within a span of frequency, both limits included.
 *
 * @param ranges Ranges of the raster, in any order; they may overlap.
 * @param lowHz Lower limit, hertz.
 * @param highHz Upper limit, hertz.
 * @returns Channel frequencies, hertz, ascending, each once.
 * @throws {RangeError} If a step is not above 0.
 * @example
 *   rasterChannels(defaultRaster(2), 551_000, 575_000); // [560000, 570000]
 */
export function rasterChannels(
  ranges: readonly RasterRange[],
  lowHz: number,
  highHz: number,
): number[] {
  const channels = new Set<number>();
  for (const range of ranges) {
    const first = Math.max(0, Math.ceil((lowHz - range.lowHz) / checkedStep(range)));
    const last = Math.floor((Math.min(highHz, range.highHz) - range.lowHz) / range.stepHz);
    for (let index = first; index <= last; index++) {
      channels.add(range.lowHz + index * range.stepHz);
    }
  }
  return [...channels].sort((a, b) => a - b);
}

/**
 * The channel nearest to a frequency; of two equally near the lower.
 *
 * @param ranges Ranges of the raster.
 * @param hz Frequency, hertz, whole or not.
 * @returns The channel, hertz, or null when the raster has no channel at all.
 * @throws {RangeError} If a step is not above 0.
 * @example
 *   nearestChannel(defaultRaster(1), 555_000); // 558000
 */
export function nearestChannel(ranges: readonly RasterRange[], hz: number): number | null {
  let nearest: number | null = null;
  for (const range of ranges) {
    const last = Math.floor((range.highHz - range.lowHz) / checkedStep(range));
    if (last < 0) continue;
    // Half a step rounds down, so that the lower of two equally near channels stands.
    const index = Math.ceil((hz - range.lowHz) / range.stepHz - 0.5);
    const channel = range.lowHz + Math.min(last, Math.max(0, index)) * range.stepHz;
    if (nearest === null || isNearer(channel, nearest, hz)) nearest = channel;
  }
  return nearest;
}

/**
 * Guard bands: the midpoints between neighbouring channels of a range, within a span.
 *
 * A frequency midway between two channels lies as far from both as can be.
 *
 * @param ranges Ranges of the raster.
 * @param lowHz Lower limit, hertz, included.
 * @param highHz Upper limit, hertz, included.
 * @returns Midpoints, hertz, ascending; half a hertz over where a step is odd.
 * @throws {RangeError} If a step is not above 0.
 * @example
 *   guardBands(defaultRaster(1), 545_000, 560_000); // [553500]
 */
export function guardBands(
  ranges: readonly RasterRange[],
  lowHz: number,
  highHz: number,
): number[] {
  const between = ranges.map((range) => ({
    lowHz: range.lowHz + range.stepHz / 2,
    highHz: range.highHz - range.stepHz / 2,
    stepHz: range.stepHz,
  }));
  return rasterChannels(between, lowHz, highHz);
}

/**
 * Distance from a frequency to the nearest multiple of a step: `D = min(x mod r, r - x mod r)`.
 *
 * Channels of the broadcast rasters are multiples of their step, so D of the IF, of twice and of
 * thrice the IF tell how far breakthrough and the harmonics' whistles lie from a channel, also
 * beyond the ends of the raster.
 *
 * @param stepHz Step of the raster, hertz, above 0.
 * @param hz Frequency, hertz, from 0.
 * @returns Distance, hertz, 0 to half a step.
 * @throws {RangeError} If the step is not above 0.
 * @example
 *   rasterDistance(9_000, 455_000); // 4000 (5000 from the channel below, 4000 from the one above)
 */
export function rasterDistance(stepHz: number, hz: number): number {
  const over = hz % checkedStep({ stepHz });
  return Math.min(over, stepHz - over);
}

/**
 * Step of the range that a frequency lies in or, outside all, lies nearest to.
 *
 * @param ranges Ranges of the raster.
 * @param hz Frequency, hertz.
 * @returns The step, hertz, or null when there are no ranges; of two equally near the first.
 * @example
 *   rasterStep(defaultRaster(2), 455_000); // 10000
 */
export function rasterStep(ranges: readonly RasterRange[], hz: number): number | null {
  let step: number | null = null;
  let least = Infinity;
  for (const range of ranges) {
    const outside = Math.max(range.lowHz - hz, hz - range.highHz, 0);
    if (outside >= least) continue;
    least = outside;
    step = range.stepHz;
  }
  return step;
}

function isNearer(channel: number, than: number, hz: number): boolean {
  const difference = Math.abs(channel - hz) - Math.abs(than - hz);
  return difference < 0 || (difference === 0 && channel < than);
}

function checkedStep({ stepHz }: Pick<RasterRange, 'stepHz'>): number {
  if (!(stepHz > 0)) throw new RangeError(`the step of a raster must be above 0, got ${stepHz}`);
  return stepHz;
}
