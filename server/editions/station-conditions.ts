import type { StationQuery } from '../../shared/contracts/station-list.ts';
import type { RasterRange } from '../../shared/radio/station.ts';
import { searchedFrequency } from './station-search.ts';

/** A condition in SQL over the columns of a station, with what stands for its question marks. */
export interface Condition {
  readonly sql: string;
  readonly values: readonly unknown[];
}

type Filter = Pick<StationQuery, 'search' | 'fromHz' | 'toHz' | 'only'>;

/** What a query asks of a station itself, wherever one listens. */
export function stationConditions(query: Filter, raster: readonly RasterRange[]): Condition {
  const parts = [
    ...searched(query.search),
    ...(query.fromHz === undefined ? [] : [condition('frequency_hz >= ?', query.fromHz)]),
    ...(query.toHz === undefined ? [] : [condition('frequency_hz <= ?', query.toHz)]),
    ...(query.only === 'without-place' ? [condition('latitude IS NULL')] : []),
    ...(query.only === 'without-power' ? [condition('power_w = -1')] : []),
    ...(query.only === 'off-raster' ? raster.map(offRange) : []),
  ];
  return allOf(...parts);
}

export const condition = (sql: string, ...values: unknown[]): Condition => ({ sql, values });

export const allOf = (...parts: readonly Condition[]): Condition => ({
  sql: parts.map(({ sql }) => `(${sql})`).join(' AND ') || 'TRUE',
  values: parts.flatMap(({ values }) => values),
});

function searched(text: string): Condition[] {
  if (text === '') return [];
  const pattern = `%${text.replace(/[\\%_]/g, '\\$&')}%`;
  const frequencyHz = searchedFrequency(text);
  // With its unit it is a frequency and nothing else, which an index finds.
  if (frequencyHz !== null && /hz$/i.test(text))
    return [condition('frequency_hz = ?', frequencyHz)];
  return [
    condition(
      'name LIKE ? OR call_sign LIKE ? OR frequency_hz = ?',
      pattern,
      pattern,
      frequencyHz ?? 0,
    ),
  ];
}

const offRange = ({ lowHz, highHz, stepHz }: RasterRange): Condition =>
  condition(
    'frequency_hz < ? OR frequency_hz > ? OR MOD(frequency_hz - ?, ?) <> 0',
    lowHz,
    highHz,
    lowHz,
    stepHz,
  );
