/**
 * Preferred values of components.
 *
 * Source: IEC 60063, from memory, not re-read.
 *
 * @module radio/circuits/preferred-values
 */

/** Values of one decade. Source: IEC 60063, Preferred number series for resistors and capacitors. */
const SERIES = {
  E12: [1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2],
  E24: [
    1, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2, 2.2, 2.4, 2.7, 3, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6, 6.2,
    6.8, 7.5, 8.2, 9.1,
  ],
} as const;

/** Name of a series. */
export type Series = keyof typeof SERIES;

/**
 * The preferred value nearest to a value, that with the least error; of two equally near the lower.
 *
 * @param value The value, in any unit, above 0.
 * @param series The series.
 * @returns The preferred value, in the same unit.
 * @throws {RangeError} If the value is not above 0.
 *
 * @example
 *   nearestPreferred(244.7, 'E12'); // 220
 */
export function nearestPreferred(value: number, series: Series): number {
  if (!(value > 0 && Number.isFinite(value))) {
    throw new RangeError(`value must be above 0, got ${value}`);
  }
  const decade = Math.floor(Math.log10(value));
  const around = [decade - 1, decade, decade + 1].flatMap((power) =>
    SERIES[series].map((step) => scaled(step, power)),
  );
  const away = (preferred: number): number => Math.abs(preferred / value - 1);
  return around.reduce((best, each) => (away(each) < away(best) - 1e-12 ? each : best));
}

/** Digits times a power of ten, read as a decimal so that no rounding shows. */
function scaled(step: number, power: number): number {
  return Number(`${step}e${power}`);
}
