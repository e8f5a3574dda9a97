/**
 * Selectivity of the IF amplifier.
 *
 * Source: own model through the two widths that a user knows; transformers as in
 * `coupledPairRejection`.
 *
 * @module radio/circuits/selectivity
 */
import { coupledPairCrossing, coupledPairRejection } from './coupled-pair.ts';
import { monotoneCubic } from '../mathematics/monotone-cubic.ts';
import type {
  FixedFilter,
  Selectivity,
  SelectivityTable,
  SelectivityTransformers,
  SelectivityWidths,
} from '../receiver.ts';

/** No IF amplifier is taken to reject more than this, decibels. */
const MOST_DB = 90;
/** `10^0.6 - 1` and `10^6 - 1`: powers of loss less one at -6 and -60 dB. */
const LOSS_6 = 10 ** 0.6 - 1;
const LOSS_60 = 1e6 - 1;
/** Below this shape factor, coupled pairs alone will not do. */
const LEAST_SHAPE_FACTOR = 3.5;

/** A selectivity curve with its two widths. */
export interface IfSelectivity {
  /** Total width at -6 dB, hertz. */
  readonly b6Hz: number;
  /** Total width at -60 dB, hertz. */
  readonly b60Hz: number;
  /** Rejection at a distance from the centre, decibels; the sign does not matter. */
  readonly rejectionDb: (offsetHz: number) => number;
}

/**
 * Selectivity of an IF amplifier, however it is known.
 *
 * - Two widths: `N = ln[(10^6 - 1)/(10^0.6 - 1)] / (2 ln(B60/B6))`,
 *   `A = 10 log10[1 + (10^0.6 - 1)(2|df|/B6)^(2N)]`, at most 90 dB. A model of our own through the
 *   two points.
 * - IF transformers: their number times a coupled pair, with `x = 2 Q df/IF`.
 * - A table: monotone cubic in |offset|, constant beyond the last point. A width that the table
 *   does not reach is twice its last offset.
 *
 * @param selectivity How the selectivity is known.
 * @param ifHz Centre, hertz, above 0; only transformers need it.
 * @returns The curve and its widths.
 * @throws {RangeError} If B60 is not above B6, B6, Q, count or coupling not above 0, or the points
 *   do not ascend.
 *
 * @example
 *   ifSelectivity({ kind: 'widths', b6Hz: 6000, b60Hz: 20000 }, 455000).rejectionDb(4500); // 23.3725
 */
export function ifSelectivity(selectivity: Selectivity, ifHz: number): IfSelectivity {
  switch (selectivity.kind) {
    case 'widths':
      return fromWidths(selectivity);
    case 'transformers':
      return fromTransformers(selectivity, ifHz);
    case 'table':
      return fromTable(selectivity);
  }
}

/**
 * Exponent N of the two-width model.
 *
 * @param b6Hz Total width at -6 dB, hertz, above 0.
 * @param b60Hz Total width at -60 dB, hertz, above b6Hz.
 * @returns The exponent.
 * @throws {RangeError} If the widths are not in order.
 *
 * @example
 *   skirtExponent(6000, 20000); // 5.28385
 */
export function skirtExponent(b6Hz: number, b60Hz: number): number {
  if (!(b6Hz > 0)) throw new RangeError(`b6Hz must be above 0, got ${b6Hz}`);
  if (!(b60Hz > b6Hz)) throw new RangeError(`b60Hz must be above b6Hz, got ${b60Hz}`);
  return Math.log(LOSS_60 / LOSS_6) / (2 * Math.log(b60Hz / b6Hz));
}

/**
 * Says what is odd about a selectivity; null: nothing.
 *
 * Three critically coupled pairs reach a shape factor B60/B6 of 3.61 and no more can be had from
 * coupled pairs in practice, so a smaller one wants a crystal, mechanical or ceramic filter.
 *
 * @param widths The two widths.
 * @param fixedFilter The filter, if one is fitted.
 * @returns A sentence, or null.
 *
 * @example
 *   shapeFactorWarning({ b6Hz: 6000, b60Hz: 22000 }, null); // null
 */
export function shapeFactorWarning(
  { b6Hz, b60Hz }: Pick<IfSelectivity, 'b6Hz' | 'b60Hz'>,
  fixedFilter: FixedFilter | null,
): string | null {
  const shape = b60Hz / b6Hz;
  if (fixedFilter !== null || shape >= LEAST_SHAPE_FACTOR) return null;
  return (
    `A shape factor of ${shape.toFixed(1)} is more than IF transformers give; ` +
    'check the widths or enter the crystal, mechanical or ceramic filter.'
  );
}

function fromWidths({ b6Hz, b60Hz }: SelectivityWidths): IfSelectivity {
  const power = skirtExponent(b6Hz, b60Hz);
  const rejectionDb = (offsetHz: number): number => {
    const steps = ((2 * offsetHz) / b6Hz) ** 2;
    return Math.min(MOST_DB, 10 * Math.log10(1 + LOSS_6 * steps ** power));
  };
  return { b6Hz, b60Hz, rejectionDb };
}

function fromTransformers(
  { count, q, coupling }: SelectivityTransformers,
  ifHz: number,
): IfSelectivity {
  if (!Number.isInteger(count) || count < 1) {
    throw new RangeError(`count must be a whole number from 1, got ${count}`);
  }
  if (!(q > 0)) throw new RangeError(`q must be above 0, got ${q}`);
  if (!(ifHz > 0)) throw new RangeError(`ifHz must be above 0, got ${ifHz}`);
  const width = (db: number): number => (coupledPairCrossing(db / count, coupling) * ifHz) / q;
  return {
    b6Hz: width(6),
    b60Hz: width(60),
    rejectionDb: (offsetHz) =>
      Math.min(MOST_DB, count * coupledPairRejection((2 * q * offsetHz) / ifHz, coupling)),
  };
}

function fromTable({ points }: SelectivityTable): IfSelectivity {
  const offsets = points.map(({ offsetHz }) => offsetHz);
  const curve = monotoneCubic(
    offsets,
    points.map(({ rejectionDb }) => rejectionDb),
  );
  const last = offsets.at(-1) ?? 0;
  if (!(last > 0)) throw new RangeError('points: the last offset must be above 0');
  return {
    b6Hz: 2 * outermostCrossing(curve, offsets, 6),
    b60Hz: 2 * outermostCrossing(curve, offsets, 60),
    rejectionDb: (offsetHz) => Math.min(MOST_DB, curve(Math.abs(offsetHz))),
  };
}

/** Offset of the last rise through a level; the last offset when the curve never reaches it. */
function outermostCrossing(
  curve: (offsetHz: number) => number,
  offsets: readonly number[],
  levelDb: number,
): number {
  const last = offsets.at(-1) ?? 0;
  if (curve(last) < levelDb) return last;
  const below = offsets.findLastIndex((offset) => curve(offset) < levelDb);
  if (below < 0) return offsets.find((offset) => offset > 0) ?? last;
  let [low, high] = [offsets[below] ?? 0, offsets[below + 1] ?? last];
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (curve(middle) < levelDb) low = middle;
    else high = middle;
  }
  return high;
}
