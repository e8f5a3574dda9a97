import {
  designTracking as design,
  type Tracking,
  type TrackingInput,
} from '../../shared/radio/tracking.ts';

const NO_BEST_POINTS = 'No best points can be told for this band. Give three points of your own.';

const NO_DESIGN = {
  signalCoilH: null,
  signalTrimmerF: null,
  oscillatorCoilH: null,
  padderF: null,
  oscillatorTrimmerF: null,
  pointsHz: [],
  errors: [],
  worstErrorHz: null,
} as const;

/** Designs the circuits of a sound request, or says why there are none. */
export function designTracking(input: TrackingInput): Tracking {
  try {
    return design(input);
  } catch (error) {
    // Where the error is next to nothing all over the band, no points are better than others.
    if (input.points !== 'best' || !(error instanceof RangeError)) throw error;
    return { ...NO_DESIGN, refused: { reason: NO_BEST_POINTS } };
  }
}
