import type { Site } from '../../shared/radio/site.ts';

/** What is on a list: an edition, and which version of it, another whenever its content changes. */
export interface ListContent {
  readonly editionId: number;
  readonly version: string;
}

/** Names a content. Ids are never given twice, so a deleted edition's name is never asked for again. */
export const contentKey = ({ editionId, version }: ListContent): string =>
  `${editionId}.${version}`;

/** Names a content received at a place: all that fields depend on besides time and sky wave. */
export const placeKey = (
  content: string,
  { latitude, longitude, ground }: Pick<Site, 'latitude' | 'longitude' | 'ground'>,
): string => [content, latitude, longitude, ground].join();
