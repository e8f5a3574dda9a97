/**
 * Interpolation that never overshoots the data.
 *
 * @module radio/mathematics/monotone-cubic
 */

/**
 * Builds the monotone piecewise cubic through points, constant beyond both ends.
 *
 * Slopes are the weighted harmonic means of the neighbouring secants, 0 at an extreme, and the
 * end slopes one-sided and limited, so that the curve rises and falls only where the data do.
 * Source: F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984), as in the widely used
 * PCHIP routines.
 *
 * @param xs Abscissae, strictly ascending, at least one.
 * @param ys Ordinates, as many.
 * @returns The interpolating function.
 * @throws {RangeError} If there are no points, or xs do not ascend.
 *
 * @example
 *   monotoneCubic([0, 1, 2], [0, 1, 4])(1); // 1
 */
export function monotoneCubic(xs: readonly number[], ys: readonly number[]): (x: number) => number {
  if (xs.length === 0 || xs.length !== ys.length) {
    throw new RangeError('points: give at least one, with as many ordinates as abscissae');
  }
  if (xs.some((x, index) => index > 0 && !(x > at(xs, index - 1)))) {
    throw new RangeError('points: the abscissae must ascend');
  }
  const slopes = slopesOf(xs, ys);
  const last = xs.length - 1;
  return (x) => {
    if (x <= at(xs, 0)) return at(ys, 0);
    if (x >= at(xs, last)) return at(ys, last);
    let index = 0;
    while (at(xs, index + 1) < x) index++;
    const width = at(xs, index + 1) - at(xs, index);
    const t = (x - at(xs, index)) / width;
    const rest = 1 - t;
    return (
      at(ys, index) * (1 + 2 * t) * rest * rest +
      at(ys, index + 1) * t * t * (3 - 2 * t) +
      width * t * rest * (at(slopes, index) * rest - at(slopes, index + 1) * t)
    );
  };
}

function slopesOf(xs: readonly number[], ys: readonly number[]): number[] {
  const widths = xs.slice(1).map((x, index) => x - at(xs, index));
  const secants = widths.map((width, index) => (at(ys, index + 1) - at(ys, index)) / width);
  if (secants.length < 2) return xs.map(() => secants[0] ?? 0);
  const end = secants.length - 1;
  return xs.map((_, index) => {
    if (index === 0) return endSlope(widths, secants, 0, 1);
    if (index === xs.length - 1) return endSlope(widths, secants, end, end - 1);
    const [before, after] = [at(secants, index - 1), at(secants, index)];
    if (before * after <= 0) return 0;
    const [left, right] = [at(widths, index - 1), at(widths, index)];
    const weights = [2 * right + left, right + 2 * left] as const;
    return (weights[0] + weights[1]) / (weights[0] / before + weights[1] / after);
  });
}

/** Three-point slope at an end, limited so that the curve stays monotone. */
function endSlope(
  widths: readonly number[],
  secants: readonly number[],
  outer: number,
  inner: number,
): number {
  const [h0, h1] = [at(widths, outer), at(widths, inner)];
  const [s0, s1] = [at(secants, outer), at(secants, inner)];
  const slope = ((2 * h0 + h1) * s0 - h0 * s1) / (h0 + h1);
  if (slope * s0 <= 0) return 0;
  if (s0 * s1 <= 0 && Math.abs(slope) > 3 * Math.abs(s0)) return 3 * s0;
  return slope;
}

function at(values: readonly number[], index: number): number {
  return values[index] ?? NaN;
}
