import * as z from 'zod';

import { pageQuery } from './paging.ts';
import { stationRecord } from './station-list.ts';

export const differenceKind = z.enum(
  ['added', 'gone', 'moved', 'changed-power', 'changed-frequency', 'changed-other'],
  'Give added, gone, moved, changed-power, changed-frequency or changed-other.',
);
export type DifferenceKind = z.infer<typeof differenceKind>;

/** What changed in an edition `against` another of the same region; left out: the one before it. */
export const differencesQuery = pageQuery.extend({
  against: z.coerce
    .number('Give the id of the edition to compare with.')
    .int()
    .positive()
    .optional(),
  kind: differenceKind.optional(),
});
export type DifferencesQuery = z.output<typeof differencesQuery>;

/** One station that is not the same in both editions. */
export const difference = z.object({
  /** All that changed; `added` and `gone` stand alone. */
  kinds: z.array(differenceKind),
  /** In the edition compared with; null: added. */
  before: stationRecord.nullable(),
  /** In the edition asked for; null: gone. */
  after: stationRecord.nullable(),
  /** How far it moved; null where a place is missing on either side. */
  movedM: z.number().nullable(),
  /** Power after over power before; null where either is missing or silent. */
  powerDayDb: z.number().nullable(),
  powerNightDb: z.number().nullable(),
});
export type Difference = z.infer<typeof difference>;

/** A page of the differences by frequency, and how many there are of each kind. */
export const differencesAnswer = z.object({
  items: z.array(difference),
  total: z.int().nonnegative(),
  counts: z.record(differenceKind, z.int().nonnegative()),
  /** Stations that are the same in both. */
  same: z.int().nonnegative(),
});
export type DifferencesAnswer = z.infer<typeof differencesAnswer>;
