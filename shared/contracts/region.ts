import * as z from 'zod';

import { ituRegion, nameText, noteText, resourceId } from './quantities.ts';
import { datedRaster, datedRasters, rasterRange, rasterRanges } from './raster.ts';

/**
 * What a client sends to create or change a region: one raster for ever, or dated ones. Without
 * either a new region takes the ITU Region's own and another keeps what it has.
 */
export const regionDraft = z
  .strictObject({
    name: nameText,
    ituRegion,
    raster: rasterRanges.optional(),
    rasters: datedRasters.optional(),
  })
  .refine(({ raster, rasters }) => raster === undefined || rasters === undefined, {
    path: ['rasters'],
    error: 'Give either one raster or dated rasters.',
  });
export type RegionDraft = z.output<typeof regionDraft>;

export const region = z.object({
  id: resourceId,
  name: z.string(),
  ituRegion,
  /** The raster in force today. */
  raster: z.array(rasterRange),
  /** All rasters, the earliest first. */
  rasters: z.array(datedRaster),
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
  /** The region's raster in force at the edition's date, by which it is judged. */
  raster: z.array(rasterRange),
  /** Whether the caller may change or delete it. */
  editable: z.boolean(),
  createdAt: z.iso.datetime(),
});
export type Edition = z.infer<typeof edition>;

/** What can be changed of an edition; its stations cannot. */
export const editionChange = z.strictObject({
  label: nameText,
  date: z.iso.date('Give a date such as 2026-03-01.'),
  note: noteText.default(''),
});
export type EditionChange = z.output<typeof editionChange>;
