import * as z from 'zod';

import { nameText, resourceId } from './quantities.ts';

/** What a column of a list can hold. */
export const importField = z.enum([
  'name',
  'callSign',
  'frequency',
  'latitude',
  'longitude',
  'locator',
  'power',
  'powerDay',
  'powerNight',
  'hours',
  'note',
]);
export type ImportField = z.infer<typeof importField>;

/** Unit of a column. */
export const importUnit = z.enum(['Hz', 'kHz', 'MHz', 'W', 'kW', 'dBW', 'degrees', 'dms']);
export type ImportUnit = z.infer<typeof importUnit>;

const FREQUENCY_UNITS = ['kHz', 'MHz', 'Hz'] as const;
const POWER_UNITS = ['W', 'kW', 'dBW'] as const;
const ANGLE_UNITS = ['degrees', 'dms'] as const;

/** Units in which a field can be given; none for text. */
export const importUnitsOf: Readonly<Record<ImportField, readonly ImportUnit[]>> = {
  name: [],
  callSign: [],
  frequency: FREQUENCY_UNITS,
  latitude: ANGLE_UNITS,
  longitude: ANGLE_UNITS,
  locator: [],
  power: POWER_UNITS,
  powerDay: POWER_UNITS,
  powerNight: POWER_UNITS,
  hours: [],
  note: [],
};

/** How one column is read; a column with field null is left out. */
export const importColumn = z.object({
  header: z.string(),
  field: importField.nullable(),
  unit: importUnit.nullable(),
});
export type ImportColumn = z.infer<typeof importColumn>;

/** Answer to an upload: what was found, and how the columns are proposed to be read. */
export const importProposal = z.object({
  id: resourceId,
  fileName: z.string(),
  encoding: z.string(),
  delimiter: z.string(),
  decimalMark: z.enum(['.', ',']),
  columns: z.array(importColumn),
  /** First rows of the file, as text. */
  sample: z.array(z.array(z.string())),
  /** Whether the proposed matching needs no answer. */
  complete: z.boolean(),
});
export type ImportProposal = z.infer<typeof importProposal>;

/** How to read the file, and what to call the edition. */
export const importMatching = z.strictObject({
  columns: z
    .array(
      z.strictObject({
        header: z.string(),
        field: importField.nullable(),
        unit: importUnit.nullable().default(null),
      }),
    )
    .max(200)
    .optional(),
  /** What to call the edition; left out: as the file is called. */
  label: nameText.optional(),
  date: z.iso.date('Give a date such as 2026-03-01.').optional(),
});
export type ImportMatching = z.output<typeof importMatching>;

/** One rejected value: the line counts from 1 with the header. */
export const importFault = z.object({
  line: z.int(),
  column: z.string(),
  value: z.string(),
  expected: z.string(),
});
export type ImportFault = z.infer<typeof importFault>;

/** What storing the file would do. */
export const importCheck = z.object({
  rows: z.object({
    total: z.int(),
    new: z.int(),
    changed: z.int(),
    same: z.int(),
    rejected: z.int(),
    duplicate: z.int(),
  }),
  /** The first 1000 faults; the rejects download has all. */
  faults: z.array(importFault),
});
export type ImportCheck = z.infer<typeof importCheck>;

/** How far an import is. */
export const importState = z.object({
  id: resourceId,
  state: z.enum([
    'uploaded',
    'checking',
    'ready',
    'committing',
    'committed',
    'failed',
    'cancelled',
    'undone',
  ]),
  /** From 0 to 1. */
  progress: z.number(),
  rows: importCheck.shape.rows.nullable(),
  /** The first 1000 faults, from the check until the commit; else none, so that polling stays light. */
  faults: z.array(importFault).default([]),
  /** What was found in the file, its columns as last matched: a reloaded page goes on from here. */
  proposal: importProposal,
  /** What the edition will be called, once the matching has been sent. */
  label: z.string().nullable(),
  date: z.iso.date().nullable(),
  editionId: resourceId.nullable(),
  /** Why it failed, in a sentence; else null. */
  reason: z.string().nullable(),
});
export type ImportState = z.infer<typeof importState>;
