/**
 * Image and IF rejection over the dial.
 *
 * Source: as in `FrontEnd`.
 *
 * @module radio/assessment/rejection-curve
 */
import type { FrontEnd } from '../circuits/front-end.ts';
import type { Band, Receiver } from '../receiver.ts';
import { imageFrequency } from '../mixing/superheterodyne.ts';
import { tuningOf } from '../tracking/tuning.ts';

/** Both ends and 39 settings evenly between. */
const POINTS = 41;
/** An image below this is taken to lie here: the rejection of a circuit is endless at 0. */
const LOWEST_HZ = 1;

/** Rejection at one dial setting, stray pick-up included. */
export interface RejectionPoint {
  readonly dialHz: number;
  readonly imageDb: number;
  readonly ifDb: number;
}

/**
 * Rejection A of the image and of the IF, not above stray pick-up, over the whole dial: the
 * breakthrough is worst at the end nearest the IF, the image at the high end.
 *
 * The mixer's feedthrough of the IF is no part of it.
 *
 * @param receiver The receiver.
 * @param frontEnd Front end of the band.
 * @param band The band.
 * @returns 41 points, ascending.
 */
export function rejectionCurve(
  { ifHz, strayDb }: Pick<Receiver, 'ifHz' | 'strayDb'>,
  frontEnd: FrontEnd,
  band: Band,
): RejectionPoint[] {
  const { tuning } = tuningOf(band, ifHz, ifHz);
  return Array.from({ length: POINTS }, (_, index) => {
    const dialHz = band.lowHz + ((band.highHz - band.lowHz) * index) / (POINTS - 1);
    const tunedHz = tuning === null ? dialHz : tuning(dialHz);
    const imageHz = Math.max(LOWEST_HZ, imageFrequency(dialHz, ifHz, band.oscillator));
    return {
      dialHz: Math.round(dialHz),
      imageDb: Math.min(frontEnd.rejectionDb(imageHz, dialHz, tunedHz), strayDb?.image ?? Infinity),
      ifDb: Math.min(frontEnd.rejectionDb(ifHz, dialHz, tunedHz), strayDb?.if ?? Infinity),
    };
  });
}
