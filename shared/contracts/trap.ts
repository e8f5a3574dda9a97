import * as z from 'zod';

import { trapFrequency } from '../radio/circuits/trap.ts';
import type { TrapDesign, TrapInput as RadioTrapInput } from '../radio/circuits/trap-design.ts';
import { frequencyHz, qValue } from './quantities.ts';

const LEAST_H = 1e-9;
const MOST_H = 1;
const LEAST_F = 1e-13;
const MOST_F = 1e-3;

const inductanceH = z
  .number('Give an inductance in henries.')
  .min(LEAST_H, 'Give an inductance of 1 nH or more.')
  .max(MOST_H, 'Give an inductance of 1 H or less.');
const capacitanceF = z
  .number('Give a capacitance in farads.')
  .min(LEAST_F, 'Give a capacitance of 0.1 pF or more.')
  .max(MOST_F, 'Give a capacitance of 1 mF or less.');
const resistanceOhms = z
  .number('Give a resistance in ohms.')
  .min(0.1, 'Give 0.1 ohm to 10 megohms.')
  .max(1e7, 'Give 0.1 ohm to 10 megohms.');

/** What a trap stands between, and how good its coil is. */
const surroundings = {
  kind: z.enum(
    ['parallel', 'series'],
    'Give "parallel" (in the aerial lead) or "series" (across the input).',
  ),
  q: qValue,
  sourceOhms: resistanceOhms,
  loadOhms: resistanceOhms,
};

/** A wave trap that is fitted to a receiver. */
export const trap = z.strictObject({ ...surroundings, inductanceH, capacitanceF });

/** A trap to be designed: its frequency and one of its parts. */
export const trapRequest = z
  .strictObject({
    frequencyHz,
    ...surroundings,
    inductanceH: inductanceH.optional(),
    capacitanceF: capacitanceF.optional(),
    atHz: z.array(frequencyHz).max(1000, 'Ask for the loss at 1000 frequencies or fewer.'),
  })
  .superRefine((request, context) => {
    const refuse = (field: string, message: string): void => {
      context.addIssue({ code: 'custom', path: [field], message });
    };
    const { frequencyHz: hz, inductanceH: coil, capacitanceF: capacitor } = request;
    if (coil !== undefined && capacitor !== undefined) {
      refuse('capacitanceF', 'Give the coil or the capacitor, not both: the other is computed.');
    } else if (coil !== undefined && isOutside(otherPart(hz, coil), LEAST_F, MOST_F)) {
      refuse('inductanceH', wontDo('coil', otherPart(hz, coil), 'F'));
    } else if (capacitor !== undefined && isOutside(otherPart(hz, capacitor), LEAST_H, MOST_H)) {
      refuse('capacitanceF', wontDo('capacitor', otherPart(hz, capacitor), 'H'));
    } else if (coil === undefined && capacitor === undefined) {
      refuse('inductanceH', 'Give the coil or the capacitor: the other is computed.');
    }
  });
export type TrapRequest = z.output<typeof trapRequest>;
export type TrapRequestInput = z.input<typeof trapRequest>;

const wontDo = (part: string, needed: number, unit: string): string =>
  `With this ${part} the other part would have to be ${needed.toPrecision(3)} ${unit}. ` +
  'Coils from 1 nH to 1 H and capacitors from 0.1 pF to 1 mF can be had.';

/** What is not finite comes of a value that is refused by itself. */
const isOutside = (needed: number, least: number, most: number): boolean =>
  Number.isFinite(needed) && (needed < least || needed > most);

/** The part that resonates with another: `1/[(2 pi f)^2 part]`. */
const otherPart = (hz: number, part: number): number =>
  (trapFrequency({ inductanceH: 1, capacitanceF: 1 }) / hz) ** 2 / part;

const parts = { inductanceH: z.number(), capacitanceF: z.number() };
const preferred = z.object({ ...parts, frequencyHz: z.int() });

/** The trap, what the nearest preferred values resonate at, and the loss of the exact one. */
export const trapAnswer = z.object({
  ...parts,
  parts: z.object(parts),
  preferred: z.object({ E12: preferred, E24: preferred }),
  loss: z.array(z.object({ frequencyHz: z.int(), db: z.number() })),
});
export type TrapAnswer = z.output<typeof trapAnswer>;

type Deep<T> = T extends object ? { -readonly [K in keyof T]: Deep<T[K]> } : T;
type Takes<T extends RadioTrapInput> = T;
type Answers<T extends Omit<TrapAnswer, keyof typeof parts>> = T;
/** Fail to compile when the contract and the engine part ways. */
export type CheckedTrapRequest = Takes<TrapRequest>;
export type CheckedTrapAnswer = Answers<Deep<TrapDesign>>;
