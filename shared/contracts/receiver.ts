import * as z from 'zod';

import { ifSelectivity } from '../radio/circuits/selectivity.ts';
import type { Receiver as RadioReceiver } from '../radio/receiver.ts';
import { searchQuery } from './paging.ts';
import { band } from './receiver-band.ts';
import {
  decibelsValue,
  frequencyHz,
  lineText,
  nameText,
  qValue,
  resourceId,
  spanHz,
} from './quantities.ts';
import { trap } from './trap.ts';

/** Largest width of an IF amplifier; a bound also on what judging it costs. */
const WIDEST_IF_HZ = 1_000_000;
const ifWidthHz = spanHz.max(WIDEST_IF_HZ, 'Give a width of 1 MHz or less.');

const widths = z
  .strictObject({ kind: z.literal('widths'), b6Hz: ifWidthHz, b60Hz: ifWidthHz })
  .refine(({ b6Hz, b60Hz }) => b60Hz > b6Hz, {
    path: ['b60Hz'],
    error: 'The width at -60 dB must be larger than the width at -6 dB.',
  });

const transformers = z.strictObject({
  kind: z.literal('transformers'),
  count: z.int().min(1).max(10, 'Give 1 to 10 IF transformers.'),
  q: qValue,
  coupling: z.number().min(0.05).max(10, 'Give a coupling kQ between 0.05 and 10.').default(1),
});

const table = z.strictObject({
  kind: z.literal('table'),
  points: z
    .array(z.strictObject({ offsetHz: z.int().min(0), rejectionDb: decibelsValue }))
    .min(2, 'Give at least two points.')
    .max(200, 'Give at most 200 points.'),
});

const aerial = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('primary'), resonanceHz: frequencyHz, q: qValue }),
  z.strictObject({ kind: z.literal('loop') }),
]);

const fixedFilter = z.strictObject({
  kind: z.enum(['crystal', 'mechanical', 'ceramic']),
  centreHz: frequencyHz,
  widthHz: spanHz,
});

const bfo = z.strictObject({
  centreHz: frequencyHz,
  rangeHz: z.int().min(0).max(1_000_000, 'Give a reach of 1 MHz or less.'),
  pitchHz: z.int().min(0).max(20_000, 'Give a pitch of 20 kHz or less.'),
});

const secondConversion = z.strictObject({
  ifHz: frequencyHz,
  oscillator: z.enum(['above', 'below']),
});

/** The fields of a receiver, as sent and as stored; defaults are filled when parsed. */
const receiverFields = {
  name: lineText('Give a name.').max(120, 'Give at most 120 characters.').default(''),
  ifHz: frequencyHz,
  selectivity: z.discriminatedUnion('kind', [widths, transformers, table]),
  audioCornerHz: z.int().min(100).max(100_000).nullable().default(3500),
  strayDb: z
    .strictObject({ if: decibelsValue, image: decibelsValue })
    .nullable()
    .default({ if: 60, image: 60 }),
  ifFeedthroughDb: decibelsValue.default(3),
  signalToOscillatorDb: decibelsValue.default(-40),
  ifRange: z.number().min(0).max(0.9, 'Give a fraction between 0 and 0.9.').default(0.06),
  fixedFilter: fixedFilter.nullable().default(null),
  bfo: bfo.nullable().default(null),
  trap: trap.nullable().default(null),
  aerial: aerial.nullable().default(null),
  secondConversion: secondConversion.nullable().default(null),
  bands: z.array(band).min(1, 'Give at least one band.').max(20, 'Give at most 20 bands.'),
};

/** An oscillator below the signal needs every band above the IF. */
function checkOscillators(
  receiver: Pick<RadioReceiver, 'ifHz' | 'bands'>,
  context: z.RefinementCtx,
): void {
  receiver.bands.forEach((each, index) => {
    if (each.oscillator !== 'below' || each.lowHz > receiver.ifHz) return;
    context.addIssue({
      code: 'custom',
      path: ['bands', index, 'oscillator'],
      message:
        'An oscillator below the signal would reach zero here: the band must begin above the IF, ' +
        'or the oscillator run above.',
    });
  });
}

/** A table goes outwards from the centre, and no IF amplifier is wider than one MHz. */
function checkSelectivity(
  { selectivity, ifHz }: Pick<RadioReceiver, 'selectivity' | 'ifHz'>,
  context: z.RefinementCtx,
): void {
  const refuse = (field: string, message: string): void => {
    context.addIssue({ code: 'custom', path: ['selectivity', field], message });
  };
  if (selectivity.kind === 'table') {
    const offsets = selectivity.points.map(({ offsetHz }) => offsetHz);
    if (offsets.some((offset, index) => index > 0 && offset <= (offsets[index - 1] ?? 0))) {
      refuse('points', 'Give the points from the centre outwards, every offset once.');
    }
    if ((offsets.at(-1) ?? 0) > WIDEST_IF_HZ / 2) {
      refuse('points', 'Give offsets of 500 kHz or less.');
    }
  }
  if (selectivity.kind !== 'transformers') return;
  if (ifSelectivity(selectivity, ifHz).b60Hz > WIDEST_IF_HZ) {
    refuse('q', 'Give a higher Q: so the width at -60 dB would be more than 1 MHz.');
  }
}

type Judged = Pick<RadioReceiver, 'ifHz' | 'bands' | 'selectivity'>;

function checkReceiver(receiver: Judged, context: z.RefinementCtx): void {
  checkOscillators(receiver, context);
  checkSelectivity(receiver, context);
}

/** What a client sends to compute with a receiver. */
export const receiverDraft = z.strictObject(receiverFields).superRefine(checkReceiver);

/** A receiver as it is typed or sent, before defaults are filled. */
export type ReceiverInput = z.input<typeof receiverDraft>;
/** A receiver, whole: exactly what the engine computes with. */
export type ReceiverDraft = z.output<typeof receiverDraft>;

/** What a client sends to store a receiver. Lists need something to show for one without a name. */
export const newReceiver = z
  .strictObject({ ...receiverFields, name: nameText.default('Unnamed receiver') })
  .superRefine(checkReceiver);

/** A receiver without what the server decides about it, which parsing leaves out. */
export const bareReceiver = z.object(receiverFields);

/** What the server alone decides about a stored receiver. */
const keptFields = {
  id: resourceId,
  ownerName: z.string(),
  /** Whether the caller may change it. */
  editable: z.boolean(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
};

/** A change names the version it was made from; what the server decides may come back unread. */
export const receiverChange = z
  .strictObject({
    ...receiverFields,
    ...z.object(keptFields).partial().shape,
    name: nameText,
    version: z.int('Send the version you changed.').positive(),
  })
  .superRefine(checkReceiver);
export type ReceiverChange = z.output<typeof receiverChange>;

/** Which receivers are asked for, and in which order. */
export const receiverQuery = searchQuery.extend({
  sort: z.enum(['name', 'updated'], 'Give "name" or "updated".').default('name'),
});
export type ReceiverQuery = z.output<typeof receiverQuery>;

/** A receiver as it is kept. */
export const storedReceiver = z.object({
  ...keptFields,
  ...receiverFields,
  version: z.int().positive(),
});
export type StoredReceiver = z.infer<typeof storedReceiver>;

type SameShape<T extends RadioReceiver> = T;
/** Fails to compile when the contract and the engine's receiver part ways. */
export type CheckedReceiver = SameShape<ReceiverDraft>;
