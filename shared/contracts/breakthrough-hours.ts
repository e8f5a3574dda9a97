import * as z from 'zod';

import { grade } from './assessment.ts';
import { receiverDraft } from './receiver.ts';
import { site } from './site.ts';
import { hasOneSource, oneSourceIssue, stationSourceFields } from './station.ts';

/** A receiver at a site through one day, 0 to 24 hours UTC, every half-hour. */
export const breakthroughHoursRequest = z
  .strictObject({
    receiver: receiverDraft,
    site,
    ...stationSourceFields,
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

/** When the breakthrough rises and falls: the first half-hour by which it has happened. */
export const breakthroughHoursAnswer = z.object({
  hours: z.array(z.object({ at: moment, breakthrough: heardAtHour, image: heardAtHour })),
  rises: z.array(moment),
  falls: z.array(moment),
});
export type BreakthroughHoursAnswer = z.infer<typeof breakthroughHoursAnswer>;

const HALF_HOURS = 48;

/** The half-hours of the day that was asked for. */
export const halfHoursOf = (date: string): Date[] =>
  Array.from(
    { length: HALF_HOURS },
    (_, index) => new Date(Date.parse(`${date}T00:00:00Z`) + index * 1_800_000),
  );
