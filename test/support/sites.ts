import type { NamedSiteInput } from '../../shared/contracts/site.ts';

/** A site in Region 1 with residential noise and no place: for stations whose field is given. */
export const BARE_SITE = { noise: 'residential', ituRegion: 1 } as const;

/** A whole site on invented ground. */
export const sentSite = (change: Partial<NamedSiteInput> = {}): NamedSiteInput => ({
  name: 'Attic',
  latitude: 50,
  longitude: 8,
  ground: 'average',
  noise: 'residential',
  ituRegion: 1,
  ...change,
});
