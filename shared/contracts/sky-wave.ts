import * as z from 'zod';

/** By which published formula the sky wave is computed, and in what share of the nights exceeded. */
export const skyWaveChoice = z
  .strictObject({
    form: z
      .enum(['cfr-73-190', 'itu-r-p1147'], 'Give cfr-73-190 or itu-r-p1147.')
      .default('cfr-73-190'),
    nights: z.literal([50, 10], 'Give 50 or 10 percent of the nights.').default(50),
  })
  .prefault({});
