import * as z from 'zod';

import type { Whistles as RadioWhistles } from '../radio/whistles/whistle-causes.ts';
import { cause } from './assessment.ts';
import { frequencyHz, receptionTime } from './quantities.ts';
import { receiverDraft } from './receiver.ts';
import { site } from './site.ts';
import { hasOneSource, oneSourceIssue, stationSourceFields } from './station.ts';

/** A whistle heard at a dial setting; what was not noted about it is left out. */
export const whistlesRequest = z
  .strictObject({
    receiver: receiverDraft,
    site,
    ...stationSourceFields,
    period: receptionTime.default('night'),
    dialHz: frequencyHz,
    pitchHz: z.number().min(0).max(20_000, 'Give a pitch of 20 kHz or less.').nullish(),
    /** Hertz of pitch per hertz of dial; its sign does not matter. */
    pitchSlope: z.number().min(-100).max(100, 'Give a slope from -100 to 100.').nullish(),
  })
  .refine(hasOneSource, oneSourceIssue)
  .refine(
    ({ receiver, dialHz }) =>
      receiver.bands.some(({ lowHz, highHz }) => dialHz >= lowHz && dialHz <= highHz),
    { path: ['dialHz'], error: 'Give a frequency that a band of the receiver tunes.' },
  );
export type WhistlesRequest = z.output<typeof whistlesRequest>;
export type WhistlesInput = z.input<typeof whistlesRequest>;

const whistleCause = z.object({
  cause: z.enum([
    ...cause.options,
    'adjacent-carrier',
    'if-harmonic',
    'bfo-harmonic',
    'second-oscillator',
  ]),
  name: z.string(),
  station: z.int().nullable(),
  secondStation: z.int().optional(),
  frequencyHz: z.int(),
  pitchHz: z.int(),
  slope: z.number(),
  levelDb: z.number().nullable(),
  test: z.string(),
});

/** The station listened to, and what may whistle there, the most likely first. */
export const whistlesAnswer = z.object({
  wanted: z.object({
    station: z.int().nullable(),
    frequencyHz: z.int(),
    fieldDb: z.number(),
  }),
  /** Noise at the dial setting, dB(uV/m). */
  noiseDb: z.number(),
  skipped: z.array(z.object({ station: z.int(), reason: z.string() })),
  causes: z.array(whistleCause),
});

export type WhistlesAnswer = z.infer<typeof whistlesAnswer>;

type Deep<T> = T extends object ? { -readonly [K in keyof T]: Deep<T[K]> } : T;
type Answers<T extends Omit<z.output<typeof whistlesAnswer>, 'skipped'>> = T;
/** Fails to compile when the contract and the engine part ways. */
export type CheckedWhistles = Answers<Deep<RadioWhistles>>;
