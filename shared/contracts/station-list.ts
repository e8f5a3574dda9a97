import * as z from 'zod';

import { correctionMark } from './correction.ts';
import { pageQuery } from './paging.ts';
import {
  decibelsValue,
  frequencyHz,
  latitude,
  longitude,
  period,
  resourceId,
} from './quantities.ts';

/** Whether a list is read as corrected by hand, or as it was imported. */
export const correctionsQuery = z.strictObject({
  corrections: z.enum(['applied', 'none'], 'Give applied or none.').default('applied'),
});

export const stationSort = z.enum(
  ['frequency', 'name', 'power', 'distance', 'field'],
  'Give frequency, name, power, distance or field.',
);
export type StationSort = z.infer<typeof stationSort>;

const hertz = z.coerce.number('Give a frequency in hertz.').int('Give whole hertz.').min(0);

/**
 * Which stations of an edition are asked for, and in which order. What depends on where one listens
 * (distance, field) takes a `site` of the workshop.
 */
const stationFilter = z.strictObject({
  ...correctionsQuery.shape,
  /** In name, call sign, or a frequency: "612", "612 kHz", "0,612 MHz". */
  search: z.string().trim().max(100, 'Give at most 100 characters.').default(''),
  fromHz: hertz.optional(),
  toHz: hertz.optional(),
  only: z
    .enum(
      ['off-raster', 'without-place', 'without-power', 'corrected'],
      'Give off-raster, without-place, without-power or corrected.',
    )
    .optional(),
  site: z.coerce.number('Give the id of a site.').int().positive().optional(),
  period: period.default('night'),
  maxDistanceM: z.coerce.number('Give a distance in metres.').min(0).optional(),
  minFieldDb: z.coerce.number('Give a field in dB(µV/m).').min(-300).max(300).optional(),
});

export const stationQuery = stationFilter
  .extend({
    ...pageQuery.shape,
    sort: stationSort.default('frequency'),
    /** Left out: ascending by frequency, name and distance, descending by power and field. */
    direction: z.enum(['asc', 'desc'], 'Give asc or desc.').optional(),
  })
  .superRefine((query, context) => {
    refuseWithoutSite({ ...query, isSorted: /^(distance|field)$/.test(query.sort) }, context);
  });
export type StationQuery = z.output<typeof stationQuery>;

/** Which stations a map shows, and at which site their fields are asked for. */
export const placesQuery = stationFilter.superRefine(refuseWithoutSite);
export type PlacesQuery = z.output<typeof placesQuery>;

/** One station, as corrected unless asked otherwise; with a site, how far and how strong there. */
export const oneStationQuery = stationFilter.pick({ corrections: true, site: true, period: true });
export type OneStationQuery = z.output<typeof oneStationQuery>;

function refuseWithoutSite(
  query: z.output<typeof stationFilter> & { readonly isSorted?: boolean },
  context: z.RefinementCtx,
): void {
  if (query.site !== undefined) return;
  const needing = [
    ['maxDistanceM', query.maxDistanceM !== undefined],
    ['minFieldDb', query.minFieldDb !== undefined],
    ['sort', query.isSorted === true],
  ] as const;
  for (const [path, isAsked] of needing) {
    if (!isAsked) continue;
    const message = 'Give a site: distance and field depend on where one listens.';
    context.addIssue({ code: 'custom', path: [path], message });
  }
}

/** What a list says of a station. */
export const stationRecord = z.object({
  id: resourceId,
  name: z.string(),
  callSign: z.string(),
  frequencyHz,
  latitude: latitude.nullable(),
  longitude: longitude.nullable(),
  powerDayW: z.number().nullable(),
  powerNightW: z.number().nullable(),
  hours: z.string(),
  note: z.string(),
  /** Gains of a directional aerial, dB, every 10 degrees from north; null: all round. */
  patternDb: z.array(decibelsValue).length(36).nullable(),
});
export type StationRecord = z.infer<typeof stationRecord>;

/** A station of an edition, as it is listed. */
export const listedStation = stationRecord.extend({
  /** As it was imported, where it was changed by hand. */
  official: stationRecord.nullable(),
  /** Whether the frequency is a channel of the raster in force at the edition's date. */
  onRaster: z.boolean(),
  /** Ticked as off the air: computing passes over it. */
  offAir: z.boolean(),
  /** What was corrected by hand, the latest last. */
  corrections: z.array(correctionMark),
  /** From the site that was asked for; null without one, or where the station has no place. */
  distanceM: z.number().nullable(),
  /** At the site in the period that was asked for, dB(µV/m). */
  fieldDb: z.number().nullable(),
});
export type ListedStation = z.infer<typeof listedStation>;

/** The most stations that a map takes at once. */
export const MOST_PLACES = 20_000;

/** A station as a map shows it. */
export const stationPlace = listedStation
  .pick({
    id: true,
    frequencyHz: true,
    powerDayW: true,
    powerNightW: true,
    onRaster: true,
    offAir: true,
    distanceM: true,
    fieldDb: true,
  })
  .extend({ name: z.string(), latitude, longitude });
export type StationPlace = z.infer<typeof stationPlace>;

/** The strongest stations found that have a place: at the site, or by power where none is named. */
export const stationPlaces = z.object({
  items: z.array(stationPlace),
  /** Stations found in all, also those beyond the most that are given. */
  total: z.int().nonnegative(),
  /** How many of the strongest have no place. */
  withoutPlace: z.int().nonnegative(),
});
export type StationPlaces = z.infer<typeof stationPlaces>;
