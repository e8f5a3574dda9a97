import * as z from 'zod';

import { assessment, verdict } from './assessment.ts';
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
    /** The set-up on trial, with its present IF; null: as it is saved. */
    receiver: receiverDraft.nullable().default(null),
  })
  .refine(({ editionId, everyChannelDb }) => (editionId === null) !== (everyChannelDb === null), {
    path: ['editionId'],
    error: 'Give either an edition or the field assumed on every channel.',
  });
export type PlanDraft = z.output<typeof planDraft>;
export type PlanInput = z.input<typeof planDraft>;

const byPeriod = z.object({ day: verdict, night: verdict });

/**
 * What the server computed when the plan was kept: the candidates and verdicts of the chosen IF,
 * and the verdicts of the set as it was saved.
 */
export const planResults = z.object({
  present: candidate,
  chosen: candidate,
  ...byPeriod.shape,
  before: byPeriod.nullable().default(null),
});

/** A station that a plan names. Its responses and verdicts know it by its place in the plan's list. */
export const planStation = z.object({
  name: z.string(),
  callSign: z.string(),
  frequencyHz: z.int(),
});
export type PlanStation = z.infer<typeof planStation>;

/**
 * What is heard with the chosen IF: the worst of each band, with their working. Kept plans are read
 * by this: what the engine's answer gains later needs a default here.
 */
export const planJudgement = z.object({
  warnings: assessment.shape.warnings,
  leftOut: z.array(z.object({ reason: z.string(), count: z.int() })),
  bands: z.array(assessment.shape.bands.element.omit({ totals: true })),
});
export type PlanJudgement = z.infer<typeof planJudgement>;

/** The list a plan was judged by, as it was called then. */
export const planEdition = z.object({
  label: z.string(),
  date: z.iso.date(),
  source: z.string(),
  regionName: z.string(),
  stations: z.int(),
});

/** What a plan says by itself, whoever reads it. */
const planFindings = {
  name: z.string(),
  note: z.string(),
  ifHz: frequencyHz,
  period,
  siteName: z.string(),
  site,
  editionLabel: z.string().nullable(),
  edition: planEdition.nullable(),
  everyChannelDb: z.number().nullable(),
  /** The receiver as it was judged, still with its present IF. */
  receiver: receiverDraft,
  /** The receiver as it was saved then, where the set-up was on trial. */
  savedReceiver: receiverDraft.nullable(),
  results: planResults,
  keptAt: z.iso.datetime(),
};

/** The responses behind the findings; plans of old have none. */
const planWorking = {
  stations: z.array(planStation),
  judged: z.object({ day: planJudgement, night: planJudgement }).nullable(),
};

/** A receiver judged at one site against one edition, with a chosen IF, as it was when kept. */
export const plan = z.object({
  ...planFindings,
  id: resourceId,
  receiverId: resourceId,
  siteId: resourceId.nullable(),
  editionId: resourceId.nullable(),
  keptBy: z.string(),
  /** Whether the caller may delete and share it. */
  editable: z.boolean(),
  /** What has changed since it was judged. */
  standing: z.object({
    newerEdition: z.object({ id: resourceId, label: z.string(), date: z.iso.date() }).nullable(),
    /** The edition it was judged by was corrected by hand. */
    isEditionCorrected: z.boolean(),
    isReceiverChanged: z.boolean(),
    isSiteChanged: z.boolean(),
  }),
  /** The link by which anyone can read it, if there is one. */
  sharing: z.object({ sharedBy: z.string(), sharedAt: z.iso.datetime() }).nullable(),
});
export type Plan = z.infer<typeof plan>;

/** A plan with all that was heard. */
export const wholePlan = plan.extend(planWorking);
export type WholePlan = z.infer<typeof wholePlan>;

/** The secret end of a link to a plan; it is told once. */
export const planShare = z.object({ token: z.string(), sharedAt: z.iso.datetime() });
export type PlanShare = z.infer<typeof planShare>;

/** A plan as whoever has its link may read it: no ids, no people, the site's place made coarse. */
export const sharedPlan = z.object({
  ...planFindings,
  ...planWorking,
  workshopName: z.string(),
  sharedAt: z.iso.datetime(),
});
export type SharedPlan = z.infer<typeof sharedPlan>;

/** A plan to be shown, by whichever way it came. */
export type ReadablePlan = Pick<WholePlan, keyof typeof planFindings | keyof typeof planWorking>;
