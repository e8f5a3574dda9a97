import * as z from 'zod';

import { grade } from './assessment.ts';
import { receiverDraft } from './receiver.ts';
import { site } from './site.ts';
import { skyWaveChoice } from './sky-wave.ts';
import { hasOneSource, oneSourceIssue, stationSourceFields } from './station.ts';

/** A receiver at a site through one day, 0 to 24 hours UTC. */
export const breakthroughHoursRequest = z
  .strictObject({
    receiver: receiverDraft,
    site,
    ...stationSourceFields,
    skyWave: skyWaveChoice,
    date: z.iso
      .date({ abort: true, error: 'Give a date, like 2026-12-21.' })
      .refine((text) => text >= '1900' && text < '2101', 'Give a year from 1900 to 2100.'),
  })
  .refine(hasOneSource, oneSourceIssue);
export type BreakthroughHoursRequest = z.output<typeof breakthroughHoursRequest>;
export type BreakthroughHoursInput = z.input<typeof breakthroughHoursRequest>;

/** The worst of one kind at a moment; null: none is heard over noise and band. */
const heardAtHour = z
  .object({
    ratioDb: z.number(),
    levelDb: z.number(),
    grade,
    station: z.int(),
    dialHz: z.int(),
  })
  .nullable();

const moment = z.iso.datetime({ offset: true });

/** When the breakthrough rises and falls: the first moment by which it has happened. */
export const breakthroughHoursAnswer = z.object({
  hours: z.array(z.object({ at: moment, breakthrough: heardAtHour, image: heardAtHour })),
  rises: z.array(moment),
  falls: z.array(moment),
});
export type BreakthroughHoursAnswer = z.infer<typeof breakthroughHoursAnswer>;

const LONG_LIST = 20_000;
const HOUR_MS = 3_600_000;

/** The half-hours of a day, or its hours for a long list, which takes its time. */
export function momentsOf(date: string, stations: number): Date[] {
  const stepMs = stations > LONG_LIST ? HOUR_MS : HOUR_MS / 2;
  const begin = Date.parse(`${date}T00:00:00Z`);
  const count = (24 * HOUR_MS) / stepMs;
  return Array.from({ length: count }, (_, index) => new Date(begin + index * stepMs));
}
