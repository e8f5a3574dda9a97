import type { JudgedBand, JudgedResponse } from '../../charts/band-strip/strip-layout';
import type { DialView } from '../address/dial-view';

type Filter = Pick<DialView, 'causes' | 'grades' | 'station' | 'isHiddenShown'>;

/** The bands with the responses that the filter lets through. */
export function filteredBands(
  bands: readonly JudgedBand[],
  filter: Filter,
  nameOf: (station: number) => string,
): JudgedBand[] {
  const part = filter.station.trim().toLocaleLowerCase();
  const isNamed = (station: number | undefined) =>
    station !== undefined && nameOf(station).toLocaleLowerCase().includes(part);
  const passes = ({ cause, grade, hidden, station, secondStation }: JudgedResponse): boolean =>
    (filter.causes.length === 0 || filter.causes.includes(cause)) &&
    (filter.grades.length === 0 || (grade !== null && filter.grades.includes(grade))) &&
    (filter.isHiddenShown || hidden === null) &&
    (part === '' || isNamed(station) || isNamed(secondStation));
  return bands.map((band) => ({ ...band, responses: band.responses.filter(passes) }));
}

/** How many responses a filter leaves out. */
export const leftOut = (all: readonly JudgedBand[], shown: readonly JudgedBand[]): number =>
  count(all) - count(shown);

const count = (bands: readonly JudgedBand[]): number =>
  bands.reduce((sum, { responses }) => sum + responses.length, 0);
