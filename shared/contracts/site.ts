import * as z from 'zod';

import {
  decibelsValue,
  ituRegion,
  latitude,
  longitude,
  nameText,
  resourceId,
} from './quantities.ts';

export const groundClass = z.enum(
  ['sea', 'wet', 'average', 'dry', 'poor'],
  'Give sea, wet, average, dry or poor.',
);

const siteFields = {
  latitude: latitude.nullable().default(null),
  longitude: longitude.nullable().default(null),
  ground: groundClass.nullable().default(null),
  noise: z
    .enum(['city', 'residential', 'rural', 'quiet'], 'Give city, residential, rural or quiet.')
    .nullable()
    .default(null),
  indoors: z.boolean().default(false),
  noiseFloorDb: decibelsValue.nullable().default(null),
  ituRegion,
};

const noiseIsKnown = {
  check: (site: { noise: string | null; noiseFloorDb: number | null }) =>
    site.noise !== null || site.noiseFloorDb !== null,
  issue: {
    path: ['noise'],
    error: 'Give a class of noise (city, residential, rural, quiet) or a measured noise floor.',
  },
};

/** A site as the computing calls take it; defaults filled when parsed. */
export const site = z.strictObject(siteFields).refine(noiseIsKnown.check, noiseIsKnown.issue);
export type SiteDraft = z.output<typeof site>;

/** A site without what storing adds to it, which parsing leaves out. */
export const bareSite = z.object(siteFields);

/** What a client sends to store a site. */
export const namedSite = z
  .strictObject({ name: nameText, ...siteFields })
  .refine(noiseIsKnown.check, noiseIsKnown.issue);
export type NamedSite = z.output<typeof namedSite>;
export type NamedSiteInput = z.input<typeof namedSite>;

/** A change of a stored site; what the server decides may come back unread. */
export const siteChange = z
  .strictObject({
    name: nameText,
    ...siteFields,
    id: resourceId.optional(),
    editable: z.boolean().optional(),
  })
  .refine(noiseIsKnown.check, noiseIsKnown.issue)
  .transform(({ id: _id, editable: _editable, ...bare }) => bare);

/** A site as it is kept. */
export const storedSite = z.object({
  id: resourceId,
  editable: z.boolean(),
  name: z.string(),
  ...siteFields,
});
export type StoredSite = z.infer<typeof storedSite>;
