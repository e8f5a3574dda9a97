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
  /** Latitude and longitude in one cell. */
  'place',
  'latitudeDegrees',
  'latitudeMinutes',
  'latitudeSeconds',
  'latitudeHemisphere',
  'longitudeDegrees',
  'longitudeMinutes',
  'longitudeSeconds',
  'longitudeHemisphere',
  'power',
  'powerDay',
  'powerNight',
  'hours',
  'note',
  /** One bearing of the aerial's pattern, told by its header; up to 36 such columns. */
  'pattern',
]);
export type ImportField = z.infer<typeof importField>;

/** Unit of a column. */
export const importUnit = z.enum([
  'Hz',
  'kHz',
  'MHz',
  'W',
  'kW',
  'dBW',
  'degrees',
  'dms',
  'dB',
  'relative',
]);
export type ImportUnit = z.infer<typeof importUnit>;

const FREQUENCY_UNITS = ['kHz', 'MHz', 'Hz'] as const;
const POWER_UNITS = ['W', 'kW', 'dBW'] as const;
const ANGLE_UNITS = ['degrees', 'dms'] as const;
/** Gain over the power, field relative to the strongest bearing, or the power by bearing itself. */
const PATTERN_UNITS = ['dB', 'relative', 'kW', 'W', 'dBW'] as const;

/** Units in which a field can be given; none for text. */
export const importUnitsOf: Readonly<Record<ImportField, readonly ImportUnit[]>> = {
  name: [],
  callSign: [],
  frequency: FREQUENCY_UNITS,
  latitude: ANGLE_UNITS,
  longitude: ANGLE_UNITS,
  locator: [],
  place: [],
  latitudeDegrees: [],
  latitudeMinutes: [],
  latitudeSeconds: [],
  latitudeHemisphere: [],
  longitudeDegrees: [],
  longitudeMinutes: [],
  longitudeSeconds: [],
  longitudeHemisphere: [],
  power: POWER_UNITS,
  powerDay: POWER_UNITS,
  powerNight: POWER_UNITS,
  hours: [],
  note: [],
  pattern: PATTERN_UNITS,
};

export const listEncoding = z.enum([
  'UTF-8',
  'UTF-16LE',
  'UTF-16BE',
  'windows-1250',
  'windows-1252',
  'ISO-8859-1',
  'ISO-8859-2',
  'ISO-8859-15',
]);
export const listDelimiter = z.enum([',', ';', '\t', '|']);
export const decimalMark = z.enum(['.', ',']);

/** How the text of a file is taken apart; what is left out is as it was found. */
export const importLayout = z.strictObject({
  encoding: listEncoding.optional(),
  delimiter: listDelimiter.optional(),
  decimalMark: decimalMark.optional(),
});
export type ImportLayout = z.output<typeof importLayout>;

/**
 * What a letter O beside a longitude means: east in German, west in the Romance languages. `open`:
 * the file has it and does not tell; null: it has none.
 */
export const letterO = z.enum(['east', 'west', 'open']).nullable();
export type LetterO = z.infer<typeof letterO>;

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
  decimalMark,
  /** Whether the numbers of the file leave no other decimal mark. */
  decimalMarkSure: z.boolean().default(true),
  /** Line of the column headers; what stands above is passed over. */
  headerLine: z.int().default(1),
  letterO: letterO.default(null),
  /** Whether the matching is that of an earlier list with the same headers. */
  remembered: z.boolean().default(false),
  columns: z.array(importColumn),
  /** First rows of the file, as text. */
  sample: z.array(z.array(z.string())),
  /** Whether the proposed matching needs no answer. */
  complete: z.boolean(),
  /** For a file of mended rejects: the edition that it can complete. */
  completes: z.object({ editionId: resourceId, label: z.string() }).nullable().default(null),
  /** The edition that the rows are added to, if so chosen. */
  addsTo: resourceId.nullable().default(null),
});
export type ImportProposal = z.infer<typeof importProposal>;

/** How to read the file, and what to call the edition. */
export const importMatching = importLayout.extend({
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
  letterO: z.enum(['east', 'west']).optional(),
  /** An edition of the region that the new one keeps and completes; null: the file is the whole list. */
  addsTo: resourceId.nullable().optional(),
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

/** Faults of one cause: the same column, the same thing expected. */
export const importCause = z.object({
  column: z.string(),
  expected: z.string(),
  count: z.int(),
  lines: z.array(z.int()),
});
export type ImportCause = z.infer<typeof importCause>;

/** Something done with rows that are not rejected, which a reader of the list may want to know. */
export const importRemark = z.object({
  message: z.string(),
  count: z.int(),
  lines: z.array(z.int()),
});
export type ImportRemark = z.infer<typeof importRemark>;

/** What storing the file would do. */
export const importCheck = z.object({
  rows: z.object({
    total: z.int(),
    new: z.int(),
    changed: z.int(),
    same: z.int(),
    rejected: z.int(),
    duplicate: z.int(),
    /** Rows that belong to a station of another row, such as its power by night. */
    merged: z.int().default(0),
    /** Stations of the edition before that the list no longer has. */
    gone: z.int().default(0),
    /** Stations of the completed edition that stay as they are. */
    kept: z.int().default(0),
    offRaster: z.int().default(0),
    withoutPlace: z.int().default(0),
    withoutPower: z.int().default(0),
  }),
  /** The first 1000 faults; the rejects download has all. */
  faults: z.array(importFault),
  /** All faults by their cause, the commonest first, with the first lines of each. */
  causes: z.array(importCause).default([]),
  /** How rows were read where that does not go without saying. */
  remarks: z.array(importRemark).default([]),
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
  causes: z.array(importCause).default([]),
  remarks: z.array(importRemark).default([]),
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
