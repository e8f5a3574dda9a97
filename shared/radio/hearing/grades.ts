/**
 * Grades of interference: the five words of ITU-R BS.1284, and one for what cannot be heard.
 *
 * Source: words of ITU-R BS.1284, from memory, not re-read; thresholds of ITU-R BS.560-4 and 47 CFR
 * 73.37.
 *
 * @module radio/hearing/grades
 */
import type { Service } from '../receiver.ts';

/** How a listener would call the interference; `hidden`: under the noise or under the band. */
export type Grade =
  'imperceptible' | 'perceptible' | 'slightly-annoying' | 'annoying' | 'very-annoying' | 'hidden';

/** The grades from the best to the worst. */
export const GRADES: readonly Grade[] = [
  'hidden',
  'imperceptible',
  'perceptible',
  'slightly-annoying',
  'annoying',
  'very-annoying',
];

const AUDIBLE = GRADES.slice(1);

/**
 * Lowest ratio (broadcast) or margin (other services) of each grade, decibels.
 *
 * Broadcast: ITU-R BS.560-4 (40, excellent), GE75 (30), Rio 1981 and 47 CFR 73.37 (26), the
 * minimum of HF planning (17). The match of word to figure is ours.
 */
const LOWEST_DB = {
  ratio: [40, 30, 26, 17, -Infinity],
  margin: [14, 4, 0, -9, -Infinity],
} as const;

/**
 * Grades a ratio of wanted to interfering level.
 *
 * Broadcast is graded by the ratio itself, other services by the margin over their protection
 * ratio. A limit belongs to the better grade.
 *
 * @param service Service of the band.
 * @param ratioDb Wanted over weighted interference, decibels.
 * @param protectionDb Protection ratio of the service, decibels.
 * @returns The grade, never `hidden`.
 * @throws {RangeError} If the ratio is not a number.
 *
 * @example
 *   grade('broadcast', 28, 30); // 'slightly-annoying'
 */
export function grade(service: Service, ratioDb: number, protectionDb: number): Grade {
  if (Number.isNaN(ratioDb)) throw new RangeError('ratioDb must be a number, got NaN');
  const broadcast = service === 'broadcast';
  const figure = broadcast ? ratioDb : ratioDb - protectionDb;
  const limits = broadcast ? LOWEST_DB.ratio : LOWEST_DB.margin;
  return AUDIBLE[limits.findIndex((limit) => figure >= limit)] ?? 'very-annoying';
}

/**
 * Ratio below which interference is at least as bad as a grade.
 *
 * @param service Service of the band.
 * @param worst The mildest grade still wanted.
 * @param protectionDb Protection ratio of the service, decibels.
 * @returns The limit, decibels; Infinity for `imperceptible` and `hidden`.
 *
 * @example
 *   ratioBelow('broadcast', 'slightly-annoying', 30); // 30
 */
export function ratioBelow(service: Service, worst: Grade, protectionDb: number): number {
  const place = AUDIBLE.indexOf(worst);
  if (place <= 0) return Infinity;
  return service === 'broadcast'
    ? (LOWEST_DB.ratio[place - 1] ?? Infinity)
    : (LOWEST_DB.margin[place - 1] ?? Infinity) + protectionDb;
}
