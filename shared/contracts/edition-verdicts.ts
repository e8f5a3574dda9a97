import * as z from 'zod';

import { grade } from './assessment.ts';
import { differenceKind } from './edition-differences.ts';
import { frequencyHz, period, resourceId } from './quantities.ts';

const MAX_RECEIVERS = 20;

/** Judges a page of the workshop's receivers with an edition and with the one it is compared to. */
export const verdictsRequest = z.strictObject({
  /** Left out: the edition before. */
  against: resourceId.optional(),
  siteId: resourceId,
  period: period.default('night'),
  page: z.int().min(1).max(1_000_000).default(1),
  pageSize: z
    .int()
    .min(1)
    .max(MAX_RECEIVERS, `Ask for at most ${MAX_RECEIVERS} receivers at once.`)
    .default(5),
});
export type VerdictsRequest = z.output<typeof verdictsRequest>;

const namedStation = z.object({ id: resourceId, name: z.string(), frequencyHz });

/** A verdict in a few figures. */
export const verdictFigures = z.object({
  /** Usable stations that the receiver tunes. */
  usable: z.int().nonnegative(),
  /** How many of them are harmed. */
  harmed: z.int().nonnegative(),
  deficitDb: z.number(),
  /** The station that fares worst; null: none is harmed. */
  worst: namedStation.extend({ dialHz: z.int(), ratioDb: z.number(), grade }).nullable(),
  /** The loudest station on an empty dial; null: nothing is heard there. */
  emptyDial: namedStation.extend({ dialHz: z.int(), overNoiseDb: z.number() }).nullable(),
});
export type VerdictFigures = z.infer<typeof verdictFigures>;

/** A receiver judged with both editions. */
export const receiverVerdicts = z.object({
  receiverId: resourceId,
  receiverName: z.string(),
  before: verdictFigures.nullable(),
  after: verdictFigures.nullable(),
  /** Another number harmed, other stations harmed, or a deficit that differs by 1 dB or more. */
  changed: z.boolean(),
  /** Stations that differ between the editions and are heard where somebody is harmed, or on an
   * empty dial the loudest. */
  causes: z.array(
    namedStation.extend({
      /** The edition in which it is heard so. */
      edition: z.enum(['before', 'after']),
      kinds: z.array(differenceKind),
      /** The setting where it does the most harm. */
      dialHz: z.int(),
      /** What it leaves the station wanted there; null: an empty dial. */
      ratioDb: z.number().nullable(),
    }),
  ),
  /** Why it could not be judged; else null. */
  reason: z.string().nullable(),
});
export type ReceiverVerdicts = z.infer<typeof receiverVerdicts>;
