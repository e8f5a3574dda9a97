/** Where the stations of a judgement come from. */
export type StationSource =
  | { readonly kind: 'edition'; readonly editionId: number }
  /** No list at hand: a station of this field, dB(µV/m), on every channel. */
  | { readonly kind: 'every-channel'; readonly fieldDb: number };

/** Field assumed on every channel until there is a list: a strong station by day. */
export const ASSUMED_FIELD_DB = 70;

/** The source as the computing calls name it. */
export const sourceFields = (
  source: StationSource,
): { editionId: number } | { everyChannelDb: number } =>
  source.kind === 'edition' ? { editionId: source.editionId } : { everyChannelDb: source.fieldDb };
