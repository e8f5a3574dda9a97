import { noiseField } from '../../../../shared/radio/propagation/noise';
import { guardBands, rasterChannels, rasterStep } from '../../../../shared/radio/channels/raster';
import type { Receiver } from '../../../../shared/radio/receiver';
import { ifSelectivity } from '../../../../shared/radio/circuits/selectivity';
import type { Site } from '../../../../shared/radio/site';
import type { RasterRange } from '../../../../shared/radio/station';
import { candidateRange } from './candidate-range';

/** A stretch of frequencies, hertz. */
export interface Stretch {
  readonly low: number;
  readonly high: number;
}

const LEAST_SPAN = 20_000;
const AIR = 0.1;

/** What is shown around the IF: all candidates, the skirts of the passband, and a little air. */
export function shownAround(receiver: Receiver, ...others: readonly number[]): Stretch {
  const { fromHz, toHz } = candidateRange(receiver);
  const low = Math.min(fromHz, receiver.ifHz - LEAST_SPAN, ...others);
  const high = Math.max(toHz, receiver.ifHz + LEAST_SPAN, ...others);
  const air = AIR * (high - low);
  return { low: Math.max(1000, Math.floor(low - air)), high: Math.ceil(high + air) };
}

/** Channels and guard bands of the raster on a stretch. */
export function rasterOn(
  ranges: readonly RasterRange[],
  { low, high }: Stretch,
): { channels: number[]; guards: Stretch[] } {
  return {
    channels: rasterChannels(ranges, low, high),
    // The middle third between two channels, where an IF keeps clear of both.
    guards: guardBands(ranges, low, high).map((middle) => {
      const half = (rasterStep(ranges, middle) ?? 0) / 6;
      return { low: middle - half, high: middle + half };
    }),
  };
}

/** Rejection of the IF amplifier against the offset from its centre, decibels. */
export const passband = ({ selectivity }: Receiver, ifHz: number) =>
  ifSelectivity(selectivity, ifHz).rejectionDb;

/** Noise at a frequency in the set's bandwidth, dB(µV/m). */
export function noiseAt(site: Site, receiver: Receiver): (hz: number) => number {
  const { b6Hz } = ifSelectivity(receiver.selectivity, receiver.ifHz);
  return (hz) => noiseField(site, hz, b6Hz);
}
