import * as z from 'zod';

import { grade } from './assessment.ts';
import { frequencyHz, period, spanHz } from './quantities.ts';
import { receiverDraft } from './receiver.ts';
import { site } from './site.ts';
import { hasOneSource, oneSourceIssue, stationSourceFields } from './station.ts';

const MAX_CANDIDATES = 400;

const judgedCase = z
  .strictObject({ site, ...stationSourceFields })
  .refine(hasOneSource, oneSourceIssue);

/** Which intermediate frequencies to judge, and where. */
export const candidatesRequest = z
  .strictObject({
    receiver: receiverDraft,
    site: site.optional(),
    ...stationSourceFields,
    cases: z.array(judgedCase).min(1).max(10, 'Give at most 10 cases.').optional(),
    periods: z
      .array(period)
      .min(1, 'Give "day", "night" or both.')
      .max(2)
      .default(['day', 'night']),
    fromHz: frequencyHz,
    toHz: frequencyHz,
    stepHz: spanHz,
  })
  .refine(({ fromHz, toHz }) => toHz >= fromHz, {
    path: ['toHz'],
    error: 'The range must end at or above where it begins.',
  })
  .refine(({ fromHz, toHz, stepHz }) => (toHz - fromHz) / stepHz < MAX_CANDIDATES, {
    path: ['stepHz'],
    error: `Give a step that makes at most ${MAX_CANDIDATES} candidates.`,
  })
  .refine((request) => (request.cases === undefined ? hasOneSource(request) : true), oneSourceIssue)
  .refine((request) => request.cases !== undefined || request.site !== undefined, {
    path: ['site'],
    error: 'Give a site, or cases each with a site and stations.',
  })
  .refine(
    ({ cases, ...request }) =>
      cases === undefined ||
      [request.site, request.editionId, request.stations, request.everyChannelDb].every(
        (each) => each === undefined,
      ),
    { path: ['cases'], error: 'Give either cases, or one site with its stations, not both.' },
  );
export type CandidatesRequest = z.output<typeof candidatesRequest>;
export type CandidatesInput = z.input<typeof candidatesRequest>;

const worst = z.object({
  deficitDb: z.number(),
  worstRatioDb: z.number().nullable(),
  grade: grade.nullable(),
  dialHz: z.int().nullable(),
  station: z.int().nullable(),
});

const judgedPeriod = z.object({
  breakthrough: worst,
  image: worst,
  products: worst,
  breakthroughChangeDb: z.number().nullable(),
  changeSigmaDb: z.number().nullable(),
});

export const candidate = z.object({
  ifHz: z.int(),
  reachable: z.object({ ok: z.boolean(), reason: z.string().nullable() }),
  deficitDb: z.number(),
  rasterDistanceHz: z.object({
    if: z.int().nullable(),
    twice: z.int().nullable(),
    thrice: z.int().nullable(),
  }),
  day: judgedPeriod.optional(),
  night: judgedPeriod.optional(),
  windowHz: z.object({ low: z.int(), high: z.int() }).nullable(),
  harmonics: z.array(
    z.object({
      harmonic: z.int(),
      dialHz: z.int(),
      channelHz: z.int().nullable(),
      beatHz: z.int().nullable(),
    }),
  ),
  intermodulation: z.object({ count: z.int(), nearestBeatHz: z.int().nullable() }),
  bfoShiftHz: z.int().nullable(),
  capacitanceChange: z.number(),
  trackingCostDb: z.number().nullable(),
});
export type Candidate = z.infer<typeof candidate>;

export const candidatesAnswer = z.object({
  present: candidate,
  candidates: z.array(candidate),
  ranking: z.string(),
});
export type CandidatesAnswer = z.infer<typeof candidatesAnswer>;
