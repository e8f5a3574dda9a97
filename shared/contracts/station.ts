import * as z from 'zod';

import { groundClass } from './site.ts';
import {
  decibelsValue,
  frequencyHz,
  latitude,
  lineText,
  longitude,
  powerW,
  resourceId,
} from './quantities.ts';

/** A stretch of uniform ground on the way from a station to the site. */
const pathSection = z.strictObject({
  ground: groundClass,
  lengthM: z
    .number('Give a length in metres.')
    .min(1, 'Give a length of 1 m or more.')
    .max(20_100_000, 'Give a length of half the way round the earth at most.'),
});

/** A station sent along with a computation. What is missing is said in the answer's `skipped`. */
export const sentStation = z.strictObject({
  name: lineText('Give a name.').max(200).default(''),
  frequencyHz,
  latitude: latitude.nullable().default(null),
  longitude: longitude.nullable().default(null),
  powerDayW: powerW.nullable().default(null),
  powerNightW: powerW.nullable().default(null),
  /** Field at the site, dB(uV/m); no propagation is computed then. */
  fieldDb: decibelsValue.nullable().default(null),
  /** Grounds from the station to the site, in order; left out: the site's ground all the way. */
  path: z
    .array(pathSection)
    .min(1, 'Give a section of the path at least, or leave it out.')
    .max(50, 'Give at most 50 sections.')
    .nullable()
    .default(null),
  /** Gain of the aerial relative to the power, dB, every 10 degrees clockwise from north. */
  patternDb: z
    .array(decibelsValue)
    .length(36, 'Give 36 gains, one every 10 degrees from north.')
    .nullable()
    .default(null),
});
export type SentStation = z.output<typeof sentStation>;

/** Where the stations of a computation come from: exactly one of the three. */
export const stationSourceFields = {
  editionId: resourceId.optional(),
  stations: z.array(sentStation).max(20_000, 'Send at most 20000 stations.').optional(),
  everyChannelDb: decibelsValue.optional(),
};

interface StationSource {
  readonly editionId?: unknown;
  readonly stations?: unknown;
  readonly everyChannelDb?: unknown;
}

/** Whether exactly one source of stations is named. */
export const hasOneSource = (source: StationSource): boolean =>
  [source.editionId, source.stations, source.everyChannelDb].filter((each) => each !== undefined)
    .length === 1;

export const oneSourceIssue = {
  path: ['stations'],
  error: 'Give exactly one of editionId, stations and everyChannelDb.',
};
