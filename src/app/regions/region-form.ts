import { FormArray, FormControl, FormGroup } from '@angular/forms';
import * as z from 'zod';

import { defaultRaster } from '../../../shared/radio/channels/raster';
import type { ItuRegion } from '../../../shared/radio/site';
import { needed } from '../ui/form-problems/form-issues';

/** Controls of one range of a raster. */
export function rangeForm(range?: RegionTyped['raster'][number]) {
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
    raster: new FormArray<RangeForm>([]),
  });
}

export type RegionForm = ReturnType<typeof regionForm>;

/** What can be typed into the form, valid or not. */
export const regionTyped = z.object({
  name: z.string(),
  ituRegion: z.literal([1, 2, 3]).nullable(),
  raster: z.array(
    z.object({
      lowHz: z.number().nullable(),
      highHz: z.number().nullable(),
      stepHz: z.number().nullable(),
    }),
  ),
});
type RegionTyped = z.infer<typeof regionTyped>;

/** Shows a stored region, or what was typed before. */
export function fill(form: RegionForm, { name, ituRegion, raster }: RegionTyped): void {
  form.reset({ name, ituRegion });
  showRaster(form, raster);
}

/** Fills in the raster the ITU Region plans by, unless one has been entered by hand. */
export function proposeRaster(form: RegionForm): void {
  const ituRegion = form.controls.ituRegion.value;
  if (ituRegion !== null && form.controls.raster.pristine) {
    showRaster(form, defaultRaster(ituRegion));
  }
}

/** Adds an empty range at the end. */
export function addRange(form: RegionForm): void {
  form.controls.raster.push(rangeForm());
  form.controls.raster.markAsDirty();
}

export function removeRange(form: RegionForm, index: number): void {
  form.controls.raster.removeAt(index);
  form.controls.raster.markAsDirty();
}

function showRaster(form: RegionForm, raster: RegionTyped['raster']): void {
  form.controls.raster.clear();
  for (const range of raster) form.controls.raster.push(rangeForm(range));
}
