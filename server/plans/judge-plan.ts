import {
  type AssessmentInput,
  type AssessmentRequest,
  assessmentRequest,
} from '../../shared/contracts/assessment.ts';
import type { CandidatesRequest } from '../../shared/contracts/candidates.ts';
import {
  type Plan,
  type PlanDraft,
  planResults,
  type WholePlan,
} from '../../shared/contracts/plan.ts';
import { type ReceiverDraft, receiverDraft } from '../../shared/contracts/receiver.ts';
import type { SiteDraft } from '../../shared/contracts/site.ts';
import type { Assessment } from '../../shared/radio/assessment/assessment.ts';
import type { Candidates } from '../../shared/radio/candidates/candidates.ts';
import type { Period } from '../../shared/radio/site.ts';
import type { Computed } from '../computing/engine.ts';
import type { Actor } from '../http/actor.ts';
import { InvalidError } from '../http/errors.ts';
import { judgementOf } from './plan-stations.ts';

/** Responses kept of a band: the worst, hidden ones too. */
const KEPT_RESPONSES = 40;

/** What judges receivers. */
export interface Judge {
  assess(actor: Actor, request: AssessmentRequest): Promise<Computed<Assessment>>;
  judgeCandidates(actor: Actor, request: CandidatesRequest): Promise<Computed<Candidates>>;
}

/** What a plan is judged from. */
export interface PlanInputs {
  /** The receiver as saved; the draft may bring another on trial. */
  readonly saved: ReceiverDraft;
  readonly site: SiteDraft;
  readonly draft: Pick<PlanDraft, 'editionId' | 'everyChannelDb' | 'ifHz' | 'receiver'>;
}

/** What was found; stations by the ids of their list. */
export interface JudgedPlan {
  readonly results: Plan['results'];
  readonly judged: NonNullable<WholePlan['judged']>;
}

/**
 * Judges the present IF beside the chosen one, the set with the chosen one by day and night, and
 * the set as saved.
 */
export async function judgePlan(
  judge: Judge,
  actor: Actor,
  { saved, site, draft }: PlanInputs,
): Promise<JudgedPlan> {
  const { ifHz } = draft;
  const place = { site, ...sourceOf(draft) };
  const receiver = draft.receiver ?? saved;
  const realigned = realign(receiver, ifHz);
  const ask = { receiver, periods: ['day', 'night'] as Period[], stepHz: 1 };
  const range = { fromHz: ifHz, toHz: ifHz };
  const judging = await judge.judgeCandidates(actor, { ...place, ...ask, ...range });
  const { present, candidates } = judging.read();
  const assess = async (asked: Partial<AssessmentInput> & { receiver: ReceiverDraft }) => {
    const request = assessmentRequest.parse({ ...place, leaveOutBetterThan: null, ...asked });
    return (await judge.assess(actor, request)).read();
  };
  const [day, night] = await bothPeriods((period) =>
    assess({ receiver: realigned, period, limit: KEPT_RESPONSES }),
  );
  const [dayBefore, nightBefore] = await bothPeriods((period) =>
    assess({ receiver: saved, period, limit: 1 }),
  );
  const before = { day: dayBefore.verdict, night: nightBefore.verdict };
  const verdicts = { day: day.verdict, night: night.verdict, before };
  return {
    results: planResults.parse({ present, chosen: candidates[0], ...verdicts }),
    judged: { day: judgementOf(day), night: judgementOf(night) },
  };
}

/** By day, then by night: one caller must not take all threads. */
const bothPeriods = async <T>(each: (period: Period) => Promise<T>): Promise<[T, T]> => [
  await each('day'),
  await each('night'),
];

const sourceOf = ({ editionId, everyChannelDb }: PlanInputs['draft']) =>
  editionId === null ? { everyChannelDb: everyChannelDb ?? 0 } : { editionId };

/** The receiver with the chosen IF, refused where it could not be built. */
function realign(receiver: ReceiverDraft, ifHz: number): ReceiverDraft {
  const { data, error } = receiverDraft.safeParse({ ...receiver, ifHz });
  if (data) return data;
  throw new InvalidError({ path: 'ifHz', message: error.issues[0]?.message ?? 'Give another IF.' });
}
