import type { ItuRegion } from '../../../shared/radio/site';

/** The three ITU Regions in plain words. Source: ITU Radio Regulations, Article 5, abridged. */
export const ITU_REGIONS: readonly { readonly value: ItuRegion; readonly words: string }[] = [
  { value: 1, words: $localize`Europe, Africa, Arabia and northern Asia` },
  { value: 2, words: $localize`North and South America, Greenland` },
  { value: 3, words: $localize`Southern and eastern Asia, Australia, the Pacific` },
];

/** What an ITU Region covers; empty before one is chosen. */
export const ituWords = (region: unknown): string =>
  ITU_REGIONS.find(({ value }) => value === region)?.words ?? '';
