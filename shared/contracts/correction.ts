import * as z from 'zod';

import { pageQuery } from './paging.ts';
import {
  frequencyHz,
  latitude,
  lineText,
  longitude,
  noteText,
  powerW,
  resourceId,
} from './quantities.ts';

export const correctionKind = z.enum(
  ['added', 'changed', 'off-air', 'heard'],
  'Give added, changed, off-air or heard.',
);
export type CorrectionKind = z.infer<typeof correctionKind>;

const fields = {
  name: lineText('Give a name.').max(200, 'Give at most 200 characters.'),
  callSign: lineText('Give a call sign.').max(40, 'Give at most 40 characters.'),
  frequencyHz,
  latitude: latitude.nullable(),
  longitude: longitude.nullable(),
  powerDayW: powerW.nullable(),
  powerNightW: powerW.nullable(),
  hours: lineText('Give the times of service.').max(200, 'Give at most 200 characters.'),
  note: lineText('Give a note.').max(1000, 'Give at most 1000 characters.'),
};

interface Place {
  readonly latitude?: number | null | undefined;
  readonly longitude?: number | null | undefined;
}

const isWhole = ({ latitude = null, longitude = null }: Place): boolean =>
  (latitude === null) === (longitude === null);
const halfAPlace = { path: ['longitude'], error: 'Give latitude and longitude, or neither.' };

/** A station that the list lacks. */
export const addedStation = z
  .strictObject({
    ...fields,
    name: fields.name.default(''),
    callSign: fields.callSign.default(''),
    latitude: fields.latitude.default(null),
    longitude: fields.longitude.default(null),
    powerDayW: fields.powerDayW.default(null),
    powerNightW: fields.powerNightW.default(null),
    hours: fields.hours.default(''),
    note: fields.note.default(''),
  })
  .refine(({ name, callSign }) => name !== '' || callSign !== '', {
    path: ['name'],
    error: 'Give a name or a call sign.',
  })
  .refine(isWhole, halfAPlace);
export type AddedStation = z.output<typeof addedStation>;

/** What a listed station is changed to; what is left out stays as listed. */
export const changedFields = z
  .strictObject(fields)
  .partial()
  .refine((changed) => Object.keys(changed).length > 0, {
    error: 'Give one field to change at least.',
  })
  .refine(({ latitude, longitude }) => (latitude === undefined) === (longitude === undefined), {
    path: ['longitude'],
    error: 'Change latitude and longitude together.',
  })
  .refine(isWhole, halfAPlace);
export type ChangedFields = z.output<typeof changedFields>;

/** The day it was heard, or found silent; left out: today. */
const day = z.iso.date('Give a date such as 2026-03-01.').optional();
const note = noteText.default('');

/** A correction by hand; it never touches the imported editions. */
export const correctionDraft = z.discriminatedUnion(
  'kind',
  [
    z.strictObject({ kind: z.literal('added'), station: addedStation, date: day, note }),
    z.strictObject({
      kind: z.literal('changed'),
      stationId: resourceId,
      fields: changedFields,
      date: day,
      note,
    }),
    z.strictObject({
      kind: z.literal(['off-air', 'heard']),
      stationId: resourceId,
      date: day,
      note,
    }),
  ],
  'Give kind: added, changed, off-air or heard.',
);
export type CorrectionDraft = z.output<typeof correctionDraft>;

/** A change of a correction: `station` for one that adds, `fields` for one that changes. */
export const correctionChange = z.strictObject({
  station: addedStation.optional(),
  fields: changedFields.optional(),
  date: day,
  note,
});
export type CorrectionChange = z.output<typeof correctionChange>;

/** Which corrections of a region; `editionId` says in which edition their stations are looked up. */
export const correctionQuery = pageQuery.extend({
  kind: correctionKind.optional(),
  editionId: z.coerce.number().int().positive().optional(),
});
export type CorrectionQuery = z.output<typeof correctionQuery>;

/** A correction as it is kept. */
export const correction = z.object({
  id: resourceId,
  regionId: resourceId,
  kind: correctionKind,
  /** The station as it was listed when it was corrected, or as it was added. */
  station: z.object({
    name: z.string(),
    callSign: z.string(),
    frequencyHz,
    latitude: latitude.nullable(),
    longitude: longitude.nullable(),
  }),
  /** Its id in the edition asked for, else in the latest; null: not in there. */
  stationId: resourceId.nullable(),
  /** What an added station is, or what a changed one is changed to; else null. */
  fields: z.strictObject(fields).partial().nullable(),
  note: z.string(),
  date: z.iso.date(),
  authorName: z.string(),
  /** Whether the caller may change or remove it. */
  editable: z.boolean(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
});
export type Correction = z.infer<typeof correction>;

/** What a list says of a correction to one of its stations. */
export const correctionMark = z.object({
  id: resourceId,
  kind: correctionKind,
  date: z.iso.date(),
  note: z.string(),
  authorName: z.string(),
  /** Whether the caller may change or remove it. */
  editable: z.boolean(),
});
export type CorrectionMark = z.infer<typeof correctionMark>;
