import { type AbstractControl, FormControl, FormGroup, type ValidatorFn } from '@angular/forms';

import * as z from 'zod';

import { namedSite, type NamedSiteInput, type StoredSite } from '../../../shared/contracts/site';
import type { Ground, ItuRegion, NoiseClass } from '../../../shared/radio/site';
import { needed } from '../ui/form-problems/form-issues';
import { type Axis, formatCoordinate, parseCoordinate } from '../ui/place/coordinate';

/** Controls of a site; coordinates are held as typed. Paths are those of the contract. */
export function siteForm() {
  return new FormGroup({
    name: text(needed($localize`Give a name.`)),
    latitude: text(coordinate('latitude')),
    longitude: text(coordinate('longitude')),
    ground: new FormControl<Ground | null>('average'),
    noise: new FormControl<NoiseClass | null>('residential'),
    indoors: new FormControl(false, { nonNullable: true }),
    noiseFloorDb: new FormControl<number | null>(null),
    ituRegion: new FormControl<ItuRegion | null>(
      null,
      needed($localize`Give the ITU Region: 1, 2 or 3.`),
    ),
  });
}

export type SiteForm = ReturnType<typeof siteForm>;

/** What can be typed into the form, valid or not. */
export const siteTyped = z.object({
  name: z.string(),
  latitude: z.string(),
  longitude: z.string(),
  ground: z.enum(['sea', 'wet', 'average', 'dry', 'poor']).nullable(),
  noise: z.enum(['city', 'residential', 'rural', 'quiet']).nullable(),
  indoors: z.boolean(),
  noiseFloorDb: z.number().nullable(),
  ituRegion: z.literal([1, 2, 3]).nullable(),
});

/** What the form says, to be checked by the contract. */
export function draftOf(form: SiteForm): Record<keyof NamedSiteInput, unknown> {
  const { latitude, longitude, ...rest } = form.getRawValue();
  return {
    ...rest,
    latitude: degrees(latitude, 'latitude'),
    longitude: degrees(longitude, 'longitude'),
  };
}

/** A site as it is sent: half a place is none. */
export const siteToSave = namedSite
  .refine(({ latitude, longitude }) => longitude !== null || latitude === null, {
    path: ['longitude'],
    error: $localize`Give the longitude as well, or neither of the two.`,
  })
  .refine(({ latitude, longitude }) => latitude !== null || longitude === null, {
    path: ['latitude'],
    error: $localize`Give the latitude as well, or neither of the two.`,
  });

/** Fills the form with a stored site. */
export function fill(form: SiteForm, { id: _id, editable, ...site }: StoredSite): void {
  form.reset({
    ...site,
    latitude: written(site.latitude, 'latitude'),
    longitude: written(site.longitude, 'longitude'),
  });
  if (!editable) form.disable();
}

const text = (...validators: ValidatorFn[]) =>
  new FormControl('', { nonNullable: true, validators });

function coordinate(axis: Axis): ValidatorFn {
  return ({ value }: AbstractControl<string>) => {
    const reading = parseCoordinate(value, axis);
    return 'problem' in reading ? { problem: reading.problem } : null;
  };
}

function degrees(typed: string, axis: Axis): number | null {
  const reading = parseCoordinate(typed, axis);
  return 'problem' in reading ? null : reading.value;
}

function written(value: number | null, axis: Axis): string {
  return value === null ? '' : formatCoordinate(value, axis);
}
