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
export const stationQuery = pageQuery
  .extend({
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
    sort: stationSort.default('frequency'),
    /** Left out: ascending by frequency, name and distance, descending by power and field. */
    direction: z.enum(['asc', 'desc'], 'Give asc or desc.').optional(),
  })
  .superRefine((query, context) => {
    if (query.site !== undefined) return;
    const needing = [
      ['maxDistanceM', query.maxDistanceM !== undefined],
      ['minFieldDb', query.minFieldDb !== undefined],
      ['sort', query.sort === 'distance' || query.sort === 'field'],
    ] as const;
    for (const [path, isAsked] of needing) {
      if (!isAsked) continue;
      const message = 'Give a site: distance and field depend on where one listens.';
      context.addIssue({ code: 'custom', path: [path], message });
    }
  });
export type StationQuery = z.output<typeof stationQuery>;

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
