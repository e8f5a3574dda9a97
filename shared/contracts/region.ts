import * as z from 'zod';

import {
  frequencyHz,
  ituRegion,
  latitude,
  longitude,
  nameText,
  resourceId,
  spanHz,
} from './quantities.ts';
import { pageQuery } from './paging.ts';

/** A part of the spectrum divided into equal channels. */
export const rasterRange = z
  .strictObject({ lowHz: frequencyHz, highHz: frequencyHz, stepHz: spanHz })
  .refine(({ lowHz, highHz }) => highHz >= lowHz, {
    path: ['highHz'],
    error: 'The raster must end at or above where it begins.',
  })
  .refine(({ lowHz, highHz, stepHz }) => (highHz - lowHz) / stepHz <= 10_000, {
    path: ['stepHz'],
    error: 'Give a step that makes at most 10000 channels.',
  });

/** What a client sends to create a region; without a raster the ITU Region's own is taken. */
export const regionDraft = z.strictObject({
  name: nameText,
  ituRegion,
  raster: z.array(rasterRange).max(20, 'Give at most 20 ranges.').optional(),
});
export type RegionDraft = z.output<typeof regionDraft>;

export const region = z.object({
  id: resourceId,
  name: z.string(),
  ituRegion,
  raster: z.array(rasterRange),
  /** Whether the caller may change it and import lists. */
  editable: z.boolean(),
  editions: z.int().nonnegative(),
});
export type Region = z.infer<typeof region>;

/** One dated state of a region's list. */
export const edition = z.object({
  id: resourceId,
  regionId: resourceId,
  regionName: z.string(),
  label: z.string(),
  date: z.iso.date(),
  /** Name of the file it came from. */
  source: z.string(),
  note: z.string(),
  stations: z.int().nonnegative(),
  createdAt: z.iso.datetime(),
});
export type Edition = z.infer<typeof edition>;

/** Which stations of an edition are asked for: by name, call sign or frequency in kHz. */
export const stationQuery = pageQuery.extend({ search: z.string().trim().max(100).default('') });
export type StationQuery = z.output<typeof stationQuery>;

/** A station of an edition. */
export const listedStation = z.object({
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
  /** Whether the frequency is a channel of the region's raster. */
  onRaster: z.boolean(),
});
export type ListedStation = z.infer<typeof listedStation>;
