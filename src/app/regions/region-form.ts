import { FormArray, FormControl, FormGroup } from '@angular/forms';
import * as z from 'zod';

import type { DatedRaster } from '../../../shared/contracts/raster';
import { defaultRaster } from '../../../shared/radio/channels/raster';
import type { ItuRegion } from '../../../shared/radio/site';
import { needed } from '../ui/form-problems/form-issues';

/** Controls of one range of a raster. */
export function rangeForm(range?: RasterTyped['ranges'][number]) {
  return new FormGroup({
    lowHz: new FormControl<number | null>(
      range?.lowHz ?? null,
      needed($localize`Give the first channel of the range, such as 531 kHz.`),
    ),
    highHz: new FormControl<number | null>(
      range?.highHz ?? null,
      needed($localize`Give the last channel of the range, such as 1602 kHz.`),
    ),
    stepHz: new FormControl<number | null>(
      range?.stepHz ?? null,
      needed($localize`Give the step from channel to channel, such as 9 kHz.`),
    ),
  });
}

export type RangeForm = ReturnType<typeof rangeForm>;

/** Controls of a raster and the day from which it holds; no day: from ever. */
export const rasterForm = (raster?: RasterTyped) =>
  new FormGroup({
    from: new FormControl(raster?.from ?? '', { nonNullable: true }),
    ranges: new FormArray<RangeForm>((raster?.ranges ?? []).map((range) => rangeForm(range))),
  });

export type RasterForm = ReturnType<typeof rasterForm>;

/** Controls of a region. Paths are those of the contract. */
export function regionForm() {
  return new FormGroup({
    name: new FormControl('', {
      nonNullable: true,
      validators: needed($localize`Give a name.`),
    }),
    ituRegion: new FormControl<ItuRegion | null>(
      null,
      needed($localize`Give the ITU Region: 1, 2 or 3.`),
    ),
    rasters: new FormArray<RasterForm>([]),
  });
}

export type RegionForm = ReturnType<typeof regionForm>;

const rasterTyped = z.object({
  from: z.string(),
  ranges: z.array(
    z.object({
      lowHz: z.number().nullable(),
      highHz: z.number().nullable(),
      stepHz: z.number().nullable(),
    }),
  ),
});
type RasterTyped = z.infer<typeof rasterTyped>;

/** What can be typed into the form, valid or not. */
export const regionTyped = z.object({
  name: z.string(),
  ituRegion: z.literal([1, 2, 3]).nullable(),
  rasters: z.array(rasterTyped),
});
type RegionTyped = z.infer<typeof regionTyped>;

/** Shows a stored region, or what was typed before. */
export function fill(form: RegionForm, { name, ituRegion, rasters }: RegionTyped): void {
  form.reset({ name, ituRegion });
  showRasters(form, rasters);
}

/** A stored raster as the form holds it. */
export const typedRaster = ({ from, ranges }: DatedRaster): RasterTyped => ({
  from: from ?? '',
  ranges,
});

/** What the form says, to be checked by the contract. */
export function draftOf(form: RegionForm): unknown {
  const { rasters, ...region } = form.getRawValue();
  return {
    ...region,
    rasters: rasters.map(({ from, ranges }) => ({ from: from === '' ? null : from, ranges })),
  };
}

/** Fills in the raster the ITU Region plans by, unless one has been entered by hand. */
export function proposeRaster(form: RegionForm): void {
  const ituRegion = form.controls.ituRegion.value;
  if (ituRegion !== null && form.controls.rasters.pristine) {
    showRasters(form, [{ from: '', ranges: defaultRaster(ituRegion) }]);
  }
}

/** Adds a raster at the end: one that is offered, or an empty one. */
export function addRaster(form: RegionForm, raster?: DatedRaster): void {
  const typed = raster ? typedRaster(raster) : { from: '', ranges: [NO_RANGE] };
  form.controls.rasters.push(rasterForm(typed));
  form.controls.rasters.markAsDirty();
}

export function removeRaster(form: RegionForm, index: number): void {
  form.controls.rasters.removeAt(index);
  form.controls.rasters.markAsDirty();
}

/** Adds an empty range at the end of a raster. */
export function addRange(raster: RasterForm): void {
  raster.controls.ranges.push(rangeForm());
  raster.controls.ranges.markAsDirty();
}

export function removeRange(raster: RasterForm, index: number): void {
  raster.controls.ranges.removeAt(index);
  raster.controls.ranges.markAsDirty();
}

const NO_RANGE = { lowHz: null, highHz: null, stepHz: null };

function showRasters(form: RegionForm, rasters: readonly RasterTyped[]): void {
  form.controls.rasters.clear();
  for (const raster of rasters) form.controls.rasters.push(rasterForm(raster));
}
