import * as z from 'zod';

import { receptionTime } from './quantities.ts';
import { site } from './site.ts';
import { skyWaveChoice } from './sky-wave.ts';
import { hasOneSource, oneSourceIssue, stationSourceFields } from './station.ts';

/** At which site, and from which stations, the field is asked for. */
export const fieldStrengthsRequest = z
  .strictObject({
    site,
    ...stationSourceFields,
    period: receptionTime.default('night'),
    skyWave: skyWaveChoice,
  })
  .refine(hasOneSource, oneSourceIssue);
export type FieldStrengthsRequest = z.output<typeof fieldStrengthsRequest>;
export type FieldStrengthsInput = z.input<typeof fieldStrengthsRequest>;

export const fieldStrength = z.object({
  station: z.int(),
  name: z.string(),
  frequencyHz: z.int(),
  /** Where the station is, degrees; null: not known. */
  latitude: z.number().nullable(),
  longitude: z.number().nullable(),
  distanceM: z.number().nullable(),
  groundDb: z.number().nullable(),
  skyDb: z.number().nullable(),
  fieldDb: z.number().nullable(),
  notes: z.array(z.string()),
});

export const fieldStrengthsAnswer = z.object({ fields: z.array(fieldStrength) });
export type FieldStrengthsAnswer = z.infer<typeof fieldStrengthsAnswer>;
