import * as z from 'zod';

import type { Tracking, TrackingInput as RadioTracking } from '../radio/tracking/tracking.ts';
import { frequencyHz } from './quantities.ts';

const capacitanceF = z
  .number('Give a capacitance in farads.')
  .min(1e-14, 'Give a capacitance of 0.01 pF or more.')
  .max(1e-3, 'Give a capacitance of 1 mF or less.');

/** Gang, trimmer and points of a band, without what the band itself gives. */
const designFields = {
  gangMinF: capacitanceF,
  gangMaxF: capacitanceF,
  strayF: z
    .number('Give a capacitance in farads.')
    .min(0, 'Give a stray capacitance of 0 or more.')
    .max(1e-3, 'Give a capacitance of 1 mF or less.')
    .default(0),
  trimmer: z.enum(['gang', 'coil'], 'Give "gang" or "coil": what the trimmer sits across.'),
  points: z.union(
    [z.tuple([frequencyHz, frequencyHz, frequencyHz]), z.literal('best')],
    'Give three frequencies in hertz, or "best".',
  ),
  fixedPadderF: capacitanceF.optional(),
  alignHz: z.tuple([frequencyHz, frequencyHz], 'Give two frequencies in hertz.').optional(),
};

/** The tracking data of a band of a receiver. */
export const trackingDesign = z.strictObject(designFields);

interface Range {
  readonly lowHz: number;
  readonly highHz: number;
}

/** Adds what is wrong between the design and its band. */
export function checkDesign(
  design: z.output<typeof trackingDesign>,
  { lowHz, highHz }: Range,
  context: z.RefinementCtx,
  path: readonly string[] = [],
): void {
  const refuse = (field: string, message: string): void => {
    context.addIssue({ code: 'custom', path: [...path, field], message });
  };
  const isInside = (hz: number): boolean => hz >= lowHz && hz <= highHz;
  const { gangMinF, gangMaxF, points, alignHz } = design;
  if (!(gangMaxF > gangMinF)) refuse('gangMaxF', 'Give more than the smallest capacitance.');
  if (points !== 'best') {
    const [first, second, third] = points;
    if (!(first < second && second < third)) {
      refuse('points', 'Give three different frequencies, the lowest first.');
    }
    if (!points.every(isInside)) refuse('points', 'Give frequencies inside the band.');
  }
  if (!alignHz) return;
  if (alignHz[0] === alignHz[1]) refuse('alignHz', 'Give two different frequencies.');
  if (!alignHz.every(isInside)) refuse('alignHz', 'Give frequencies inside the band.');
}

/** A band whose oscillator circuit is to be designed. */
export const trackingRequest = z
  .strictObject({
    lowHz: frequencyHz,
    highHz: frequencyHz,
    ifHz: frequencyHz,
    oscillator: z.enum(['above', 'below'], 'Give "above" or "below".'),
    ...designFields,
  })
  .superRefine((request, context) => {
    const { lowHz, highHz, ifHz, oscillator } = request;
    const refuse = (field: string, message: string): void => {
      context.addIssue({ code: 'custom', path: [field], message });
    };
    if (!(highHz > lowHz)) refuse('highHz', 'The band must end above where it begins.');
    if (oscillator === 'below' && !(lowHz > ifHz)) {
      refuse(
        'oscillator',
        'An oscillator below the signal would reach zero here: the band must begin above the IF, ' +
          'or the oscillator run above.',
      );
    }
    checkDesign(request, request, context);
  });
export type TrackingRequest = z.output<typeof trackingRequest>;
export type TrackingInput = z.input<typeof trackingRequest>;

const part = z.number().nullable();

/** The parts and the error over the band; every part is null where the design is refused. */
export const trackingAnswer = z.object({
  refused: z.object({ reason: z.string() }).nullable(),
  signalCoilH: part,
  signalTrimmerF: part,
  oscillatorCoilH: part,
  padderF: part,
  oscillatorTrimmerF: part,
  pointsHz: z.array(z.int()),
  errors: z.array(z.object({ dialHz: z.int(), errorHz: z.number() })),
  worstErrorHz: z.number().nullable(),
});

type Takes<T extends RadioTracking> = T;
type Answers<T extends Readonly<z.output<typeof trackingAnswer>>> = T;
/** Fail to compile when the contract and the engine part ways. */
export type CheckedTrackingRequest = Takes<TrackingRequest>;
export type CheckedTrackingAnswer = Answers<Mutable<Tracking>>;
type Mutable<T> = T extends object ? { -readonly [K in keyof T]: Mutable<T[K]> } : T;
