import * as z from 'zod';

import { CURE_KINDS } from '../radio/cures/cure-plans.ts';
import type { Cures as RadioCures } from '../radio/cures/cures.ts';
import { period } from './quantities.ts';
import { receiverDraft } from './receiver.ts';
import { site } from './site.ts';
import { hasOneSource, oneSourceIssue, stationSourceFields } from './station.ts';

/** A receiver at a site whose unwanted responses are to be cured. */
export const curesRequest = z
  .strictObject({
    receiver: receiverDraft,
    site,
    ...stationSourceFields,
    periods: z
      .array(period)
      .min(1, 'Give "day", "night" or both.')
      .max(2, 'Give "day", "night" or both.')
      .default(['day', 'night']),
  })
  .refine(hasOneSource, oneSourceIssue);
export type CuresRequest = z.output<typeof curesRequest>;
export type CuresInput = z.input<typeof curesRequest>;

/** One of the three stations that do worst; null: after the cure it is no longer heard. */
const gain = z.object({
  period,
  station: z.int(),
  dialHz: z.int(),
  beforeDb: z.number(),
  afterDb: z.number().nullable(),
  gainDb: z.number().nullable(),
});

const pair = z.object({ inductanceH: z.number(), capacitanceF: z.number() });

/** A trap as a receiver takes it, what it is tuned to, and the coil for each preferred capacitor. */
const cureTrap = z.object({
  frequencyHz: z.int(),
  coilH: z.number(),
  trap: z.object({
    kind: z.enum(['parallel', 'series']),
    inductanceH: z.number(),
    capacitanceF: z.number(),
    q: z.number(),
    sourceOhms: z.number(),
    loadOhms: z.number(),
  }),
  pairs: z.object({ E12: pair, E24: pair }),
});

export const cure = z.object({
  kind: z.enum(CURE_KINDS),
  name: z.string(),
  gainDb: z.array(gain),
  deficitBeforeDb: z.number(),
  deficitAfterDb: z.number(),
  costDb: z.number(),
  parts: z.array(z.string()),
  ifHz: z.int().optional(),
  trap: cureTrap.optional(),
  reversible: z.boolean(),
  caution: z.string(),
});
export type Cure = z.infer<typeof cure>;

/** The cures on one table; what cannot be done is left out. */
export const curesAnswer = z.object({ cures: z.array(cure) });
export type CuresAnswer = z.infer<typeof curesAnswer>;

type Deep<T> = T extends object ? { -readonly [K in keyof T]: Deep<T[K]> } : T;
type Answers<T extends CuresAnswer> = T;
/** Fails to compile when the contract and the engine part ways. */
export type CheckedCures = Answers<Deep<RadioCures>>;
