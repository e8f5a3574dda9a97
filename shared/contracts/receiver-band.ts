import * as z from 'zod';

import { decibelsValue, frequencyHz, nameText, qValue, spanHz } from './quantities.ts';
import { checkDesign, trackingDesign } from './tracking.ts';

const circuit = z.strictObject({ qLow: qValue, qHigh: qValue });

/** One tuning range of a receiver. */
export const band = z
  .strictObject({
    name: nameText,
    lowHz: frequencyHz,
    highHz: frequencyHz,
    oscillator: z.enum(['above', 'below'], 'Give "above" or "below".'),
    circuits: z
      .array(circuit)
      .max(12, 'Give at most 12 tuned circuits.')
      .default([{ qLow: 80, qHigh: 80 }]),
    oscillatorHarmonic: z.int().min(1).max(5, 'Give a harmonic from 1 to 5.').default(1),
    service: z.enum(['broadcast', 'beacon', 'marine', 'telegraphy']).default('broadcast'),
    assumedWantedDb: decibelsValue.nullable().default(null),
    tuningToleranceHz: z.int().min(0).max(100_000).nullable().default(null),
    dialStepHz: spanHz.nullable().default(null),
    tracking: trackingDesign.nullable().default(null),
  })
  .refine(({ lowHz, highHz }) => highHz > lowHz, {
    path: ['highHz'],
    error: 'The band must end above where it begins.',
  })
  .superRefine((each, context) => {
    if (each.tracking !== null) checkDesign(each.tracking, each, context, ['tracking']);
  });
