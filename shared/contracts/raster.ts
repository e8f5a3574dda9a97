import * as z from 'zod';

import { frequencyHz, ituRegion, spanHz } from './quantities.ts';

const MAX_RANGES = 20;
const MAX_CHANNELS = 10_000;

/** A part of the spectrum divided into equal channels. */
export const rasterRange = z.object({ lowHz: frequencyHz, highHz: frequencyHz, stepHz: spanHz });

const sentRange = z
  .strictObject(rasterRange.shape)
  .refine(({ lowHz, highHz }) => highHz >= lowHz, {
    path: ['highHz'],
    error: 'The raster must end at or above where it begins.',
  })
  .refine(({ lowHz, highHz, stepHz }) => (highHz - lowHz) / stepHz <= MAX_CHANNELS, {
    path: ['stepHz'],
    error: `Give a step that makes at most ${MAX_CHANNELS} channels.`,
  })
  .refine(({ lowHz, highHz, stepHz }) => highHz < lowHz || (highHz - lowHz) % stepHz === 0, {
    path: ['stepHz'],
    error: 'Give a step of which a whole number leads from the first channel to the last.',
  });

type Range = z.output<typeof rasterRange>;

/** Ranges of one raster as they are sent; a single channel is a range that ends where it begins. */
export const rasterRanges = z
  .array(sentRange)
  .max(MAX_RANGES, `Give at most ${MAX_RANGES} ranges.`)
  .superRefine((ranges, context) => {
    ranges.forEach((range, index) => {
      const other = ranges.findIndex((each, before) => before < index && overlap(each, range));
      if (other < 0) return;
      const message = `Let the ranges lie apart: this one overlaps range ${other + 1}.`;
      context.addIssue({ code: 'custom', path: [index, 'lowHz'], message });
    });
  });

const overlap = (one: Range, other: Range): boolean =>
  one.lowHz <= other.highHz && other.lowHz <= one.highHz;

/** A raster and the day from which it holds; null: from ever. */
export const datedRaster = z.object({
  from: z.iso.date().nullable(),
  ranges: z.array(rasterRange),
});
export type DatedRaster = z.output<typeof datedRaster>;

/** Rasters of a region as they are sent, in any order. */
export const datedRasters = z
  .array(
    z.strictObject({
      from: z.iso.date('Give a date such as 1978-11-23, or null for from ever.').nullable(),
      ranges: rasterRanges,
    }),
  )
  .min(1, 'Give one raster at least.')
  .max(20, 'Give at most 20 rasters.')
  .superRefine((rasters, context) => {
    rasters.forEach(({ from }, index) => {
      if (rasters.findIndex((other) => other.from === from) === index) return;
      const message = `Give another date: a raster ${from === null ? 'from ever' : `from ${from}`} is there already.`;
      context.addIssue({ code: 'custom', path: [index, 'from'], message });
    });
  });

/** A raster that comes with the product, to begin with. */
export const suppliedRaster = z.object({
  name: z.string(),
  ituRegions: z.array(ituRegion),
  from: z.iso.date(),
  ranges: z.array(rasterRange),
  /** The agreement it is taken from. */
  source: z.string(),
});
export type SuppliedRaster = z.output<typeof suppliedRaster>;

/**
 * The ranges in force on a day: of the latest raster that holds by then. A day before all of them
 * is judged by the earliest.
 */
export function rangesInForce(rasters: readonly DatedRaster[], day: string): Range[] {
  const byDate = [...rasters].sort((a, b) => (a.from ?? '').localeCompare(b.from ?? ''));
  const inForce = byDate.filter(({ from }) => (from ?? '') <= day).at(-1) ?? byDate[0];
  return inForce?.ranges ?? [];
}
