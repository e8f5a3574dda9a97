import * as z from 'zod';

const MAX_FREQUENCY_HZ = 1_000_000_000;

/** A frequency of a receiver or a station: whole hertz from 1 kHz to 1 GHz. */
export const frequencyHz = z
  .int('Give a whole number of hertz.')
  .min(1000, 'Give a frequency of 1 kHz or more.')
  .max(MAX_FREQUENCY_HZ, 'Give a frequency of 1 GHz or less.');

/** A difference of frequencies: whole hertz above 0. */
export const spanHz = z
  .int('Give a whole number of hertz.')
  .min(1, 'Give a width above 0.')
  .max(MAX_FREQUENCY_HZ, 'Give a width of 1 GHz or less.');

/** A level, ratio or field, decibels. */
export const decibelsValue = z
  .number('Give a number of decibels.')
  .min(-300, 'Give a level of -300 dB or more.')
  .max(300, 'Give a level of 300 dB or less.');

/** Loaded Q of a circuit. */
export const qValue = z
  .number('Give a Q.')
  .min(1, 'Give a Q of 1 or more.')
  .max(100_000, 'Give a Q of 100000 or less.');

export const latitude = z
  .number('Give degrees, north positive.')
  .min(-90, 'Give a latitude between -90 and 90 degrees.')
  .max(90, 'Give a latitude between -90 and 90 degrees.');

export const longitude = z
  .number('Give degrees, east positive.')
  .min(-180, 'Give a longitude between -180 and 180 degrees.')
  .max(180, 'Give a longitude between -180 and 180 degrees.');

/** Radiated power, watts; 0 means silent. */
export const powerW = z
  .number('Give a power in watts.')
  .min(0, 'Give a power of 0 W (silent) or more.')
  .max(100_000_000, 'Give a power of 100 MW or less.');

export const resourceId = z.int().positive();

/** One line of text, trimmed: no control characters, no halves of a character. */
export const lineText = (whatToGive: string) =>
  z
    .string(whatToGive)
    .trim()
    .regex(/^[^\p{Cc}\p{Cs}]*$/u, 'Leave out control characters.');

/** A name people read: not empty. */
export const nameText = lineText('Give a name.')
  .min(1, 'Give a name.')
  .max(120, 'Give at most 120 characters.');

/** Text of several lines. */
export const noteText = z
  .string('Give a text.')
  .trim()
  .max(4000, 'Give at most 4000 characters.')
  .regex(/^(?:[^\p{Cc}\p{Cs}]|[\t\n\r])*$/u, 'Leave out control characters.');

export const ituRegion = z.literal([1, 2, 3], 'Give the ITU Region: 1, 2 or 3.');

export const period = z.enum(['day', 'night'], 'Give "day" or "night".');

/** A moment: ISO 8601 with an offset from UTC, in the years the sun's place is known well for. */
export const instant = z.iso
  .datetime({
    offset: true,
    abort: true,
    error: 'Give a date and time with an offset, like 2026-12-21T18:30:00Z.',
  })
  .refine((text) => text >= '1900' && text < '2101', 'Give a year from 1900 to 2100.');

/** Day or night everywhere, or a moment, when the sun decides. */
export const receptionTime = z.union(
  [period, instant],
  'Give "day", "night" or a date and time with an offset, like 2026-12-21T18:30:00Z.',
);
export type ReceptionTimeAsked = z.output<typeof receptionTime>;

/** The time that was asked for, as the engine takes it. */
export const receptionTimeOf = (asked: ReceptionTimeAsked): 'day' | 'night' | Date =>
  asked === 'day' || asked === 'night' ? asked : new Date(asked);
