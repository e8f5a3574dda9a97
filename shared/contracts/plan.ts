import * as z from 'zod';

import { verdict } from './assessment.ts';
import { candidate } from './candidates.ts';
import {
  decibelsValue,
  frequencyHz,
  nameText,
  noteText,
  period,
  resourceId,
} from './quantities.ts';
import { receiverDraft } from './receiver.ts';
import { site } from './site.ts';

/** Keeps a choice of IF: the server computes what is kept, so that nobody can send a verdict. */
export const planDraft = z
  .strictObject({
    name: nameText,
    note: noteText.default(''),
    siteId: resourceId,
    editionId: resourceId.nullable().default(null),
    everyChannelDb: decibelsValue.nullable().default(null),
    period,
    ifHz: frequencyHz,
  })
  .refine(({ editionId, everyChannelDb }) => (editionId === null) !== (everyChannelDb === null), {
    path: ['editionId'],
    error: 'Give either an edition or the field assumed on every channel.',
  });
export type PlanDraft = z.output<typeof planDraft>;
export type PlanInput = z.input<typeof planDraft>;

/** What the server computed when the plan was kept; the verdicts are those of the chosen IF. */
export const planResults = z.object({
  present: candidate,
  chosen: candidate,
  day: verdict,
  night: verdict,
});

/** A receiver judged at one site against one edition, with a chosen IF, as it was when kept. */
export const plan = z.object({
  id: resourceId,
  receiverId: resourceId,
  name: z.string(),
  note: z.string(),
  ifHz: frequencyHz,
  period,
  siteId: resourceId.nullable(),
  siteName: z.string(),
  site,
  editionId: resourceId.nullable(),
  editionLabel: z.string().nullable(),
  everyChannelDb: z.number().nullable(),
  /** The receiver as it was judged, still with its present IF. */
  receiver: receiverDraft,
  results: planResults,
  keptBy: z.string(),
  keptAt: z.iso.datetime(),
  /** Whether the caller may delete it. */
  editable: z.boolean(),
});
export type Plan = z.infer<typeof plan>;
