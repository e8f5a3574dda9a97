/**
 * How a padded circuit follows a plain one on the same gang.
 *
 * Source: textbook theory of three-point tracking, from memory; exact against a numeric solution.
 *
 * @module radio/tracking/tracking-curve
 */

/** Frequency of the oscillator against that of the signal circuits, and back. */
export interface TrackingCurve {
  /** Oscillator when the signal circuits stand on a frequency, hertz. */
  readonly oscillatorHz: (signalHz: number) => number;
  /** Signal circuits when the oscillator stands on a frequency, hertz. */
  readonly signalHz: (oscillatorHz: number) => number;
}

/** Squares of the three constants of the curve, hertz squared. */
export interface TrackingConstants {
  readonly l2: number;
  readonly m2: number;
  readonly n2: number;
}

/**
 * Constants of the curve that is right at three frequencies.
 *
 *     fo^2 = m^2 (fs^2 + n^2)/(fs^2 + l^2)
 *     a = F1 + F2 + F3;  b^2 = F1 F2 + F1 F3 + F2 F3;  c^3 = F1 F2 F3;  d = a + 2f
 *     l^2 = (b^2 d - c^3)/(2f);  m^2 = l^2 + f^2 + a d - b^2;  n^2 = (c^3 d + f^2 l^2)/m^2
 *
 * The curve depends neither on the gang nor on where the trimmer sits. Source: the classical
 * coefficients of the handbooks, from memory, not re-read; exact at the three points by test.
 *
 * @param points F1, F2 and F3, hertz, ascending, all different.
 * @param signedIfHz f: the IF, negative for an oscillator below the signal.
 * @returns The constants.
 * @throws {RangeError} If the points do not ascend or the IF is 0.
 *
 * @example
 *   Math.sqrt(trackingConstants([600e3, 1000e3, 1400e3], 455e3).m2); // 4514043.1
 */
export function trackingConstants(
  points: readonly [number, number, number],
  signedIfHz: number,
): TrackingConstants {
  const [f1, f2, f3] = points;
  if (!(f1 > 0 && f2 > f1 && f3 > f2)) {
    throw new RangeError(`points must ascend and lie above 0, got ${points.join(', ')}`);
  }
  if (!(Math.abs(signedIfHz) > 0)) throw new RangeError('the IF must not be 0');
  const f = signedIfHz;
  const a = f1 + f2 + f3;
  const b2 = f1 * f2 + f1 * f3 + f2 * f3;
  const c3 = f1 * f2 * f3;
  const d = a + 2 * f;
  const l2 = (b2 * d - c3) / (2 * f);
  const m2 = l2 + f * f + a * d - b2;
  return { l2, m2, n2: (c3 * d + f * f * l2) / m2 };
}

/**
 * The curve of some constants.
 *
 * @param constants The constants.
 * @returns The curve; NaN where there is no such frequency.
 *
 * @example
 *   curveOf(trackingConstants([600e3, 1000e3, 1400e3], 455e3)).oscillatorHz(600e3); // 1055000
 */
export function curveOf({ l2, m2, n2 }: TrackingConstants): TrackingCurve {
  return {
    oscillatorHz: (signalHz) => Math.sqrt((m2 * (signalHz ** 2 + n2)) / (signalHz ** 2 + l2)),
    signalHz: (oscillatorHz) =>
      Math.sqrt((m2 * n2 - l2 * oscillatorHz ** 2) / (oscillatorHz ** 2 - m2)),
  };
}

/**
 * Tracking error: how far the station heard lies above the frequency of the signal circuits.
 *
 *     e(fs) = fo - (fs + f)
 *
 * @param curve The curve.
 * @param signedIfHz f: the IF, negative for an oscillator below the signal.
 * @param signalHz fs, hertz.
 * @returns Hertz.
 *
 * @example
 *   trackingError(curveOf(trackingConstants([600e3, 1000e3, 1400e3], 455e3)), 455e3, 550e3); // 3657.3
 */
export function trackingError(
  { oscillatorHz }: TrackingCurve,
  signedIfHz: number,
  signalHz: number,
): number {
  return oscillatorHz(signalHz) - (signalHz + signedIfHz);
}
