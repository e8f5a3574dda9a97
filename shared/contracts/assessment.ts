import * as z from 'zod';

import { receptionTime } from './quantities.ts';
import { receiverDraft } from './receiver.ts';
import { site } from './site.ts';
import { skyWaveChoice } from './sky-wave.ts';
import { hasOneSource, oneSourceIssue, stationSourceFields } from './station.ts';

export const grade = z.enum([
  'imperceptible',
  'perceptible',
  'slightly-annoying',
  'annoying',
  'very-annoying',
  'hidden',
]);

export const cause = z.enum([
  'image',
  'breakthrough',
  'half-if',
  'oscillator-harmonic',
  'product',
  'intermodulation',
  'second-image',
]);

/** What to judge: a receiver at a site against stations, by day, by night or at a moment. */
export const assessmentRequest = z
  .strictObject({
    receiver: receiverDraft,
    site,
    ...stationSourceFields,
    period: receptionTime.default('night'),
    skyWave: skyWaveChoice,
    maxM: z.int().min(0).max(5, 'Give an oscillator order from 0 to 5.').default(3),
    maxN: z.int().min(1).max(3, 'Give a signal order from 1 to 3.').default(2),
    leaveOutBetterThan: grade.exclude(['hidden']).nullable().default('slightly-annoying'),
    limit: z.int().min(1).max(10_000, 'Ask for 1 to 10000 responses a band.').default(2000),
  })
  .refine(hasOneSource, oneSourceIssue);
export type AssessmentRequest = z.output<typeof assessmentRequest>;
export type AssessmentInput = z.input<typeof assessmentRequest>;

const nullableNumber = z.number().nullable();

/** One way in which one station is heard at one dial setting. */
export const response = z.object({
  station: z.int(),
  secondStation: z.int().optional(),
  cause,
  name: z.string(),
  m: z.int().nullable(),
  n: z.int().nullable(),
  dialHz: z.int().nullable(),
  beatHz: z.int(),
  fieldDb: nullableNumber,
  distanceM: nullableNumber,
  interferenceDb: nullableNumber,
  weightingDb: nullableNumber,
  wantedDb: nullableNumber,
  wantedStation: z.int().nullable(),
  noiseDb: nullableNumber,
  bandDb: nullableNumber,
  ratioDb: nullableNumber,
  marginDb: nullableNumber,
  grade: grade.nullable(),
  hidden: z.enum(['noise', 'band']).nullable(),
  borderline: z.boolean(),
  ledger: z.array(z.object({ term: z.string(), valueDb: nullableNumber })),
});

const span = z.object({ low: z.int(), high: z.int() });
const harmonicPoints = z.array(z.object({ harmonic: z.int(), dialHz: z.int() }));

const judgedBand = z.object({
  name: z.string(),
  oscillatorHz: span,
  imageHz: span,
  rejection: z.array(z.object({ dialHz: z.int(), imageDb: z.number(), ifDb: z.number() })),
  harmonics: harmonicPoints,
  /** Harmonics of the second oscillator on the band; none without a second conversion. */
  secondOscillator: harmonicPoints,
  totals: z.array(
    z.object({ dialHz: z.int(), ratioDb: z.number(), grade, stations: z.array(z.int()) }),
  ),
  total: z.int(),
  responses: z.array(response),
});

export const verdict = z.object({
  usable: z.int(),
  harmed: z.array(z.object({ station: z.int(), dialHz: z.int(), ratioDb: z.number(), grade })),
  emptyDial: z.object({ dialHz: z.int(), station: z.int(), overNoiseDb: z.number() }).nullable(),
  deficitDb: z.number(),
});

/** The answer: verdict, what could not be computed, and every band with its responses. */
export const assessment = z.object({
  verdict,
  warnings: z.array(z.object({ path: z.string(), message: z.string() })),
  skipped: z.array(z.object({ station: z.int(), reason: z.string() })),
  bands: z.array(judgedBand),
});
export type Assessment = z.infer<typeof assessment>;
