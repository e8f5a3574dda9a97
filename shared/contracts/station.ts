import * as z from 'zod';

import {
  decibelsValue,
  frequencyHz,
  latitude,
  lineText,
  longitude,
  powerW,
  resourceId,
} from './quantities.ts';

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
