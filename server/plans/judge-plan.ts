import { type AssessmentRequest, assessmentRequest } from '../../shared/contracts/assessment.ts';
import type { CandidatesRequest } from '../../shared/contracts/candidates.ts';
import { type Plan, type PlanDraft, planResults } from '../../shared/contracts/plan.ts';
import { type ReceiverDraft, receiverDraft } from '../../shared/contracts/receiver.ts';
import type { SiteDraft } from '../../shared/contracts/site.ts';
import type { Assessment } from '../../shared/radio/assessment/assessment.ts';
import type { Candidates } from '../../shared/radio/candidates/candidates.ts';
import type { Period } from '../../shared/radio/site.ts';
import type { Computed } from '../computing/engine.ts';
import type { Actor } from '../http/actor.ts';
import { InvalidError } from '../http/errors.ts';

/** What judges receivers. */
export interface Judge {
  assess(actor: Actor, request: AssessmentRequest): Promise<Computed<Assessment>>;
  judgeCandidates(actor: Actor, request: CandidatesRequest): Promise<Computed<Candidates>>;
}

/** What a plan is judged from. */
export interface PlanInputs {
  readonly receiver: ReceiverDraft;
  readonly site: SiteDraft;
  readonly draft: Pick<PlanDraft, 'editionId' | 'everyChannelDb' | 'ifHz'>;
}

/** Judges the present IF beside the chosen one, and the set with the chosen one by day and night. */
export async function judgePlan(
  judge: Judge,
  actor: Actor,
  { receiver, site, draft }: PlanInputs,
): Promise<Plan['results']> {
  const { ifHz } = draft;
  const source = sourceOf(draft);
  const realigned = realign(receiver, ifHz);
  const judged = await judge.judgeCandidates(actor, {
    receiver,
    site,
    ...source,
    periods: ['day', 'night'],
    fromHz: ifHz,
    toHz: ifHz,
    stepHz: 1,
  });
  const { present, candidates } = judged.read();
  const verdict = async (period: Period) => {
    const request = assessmentRequest.parse({ receiver: realigned, site, ...source, period });
    return (await judge.assess(actor, request)).read().verdict;
  };
  return planResults.parse({
    present,
    chosen: candidates[0],
    day: await verdict('day'),
    night: await verdict('night'),
  });
}

const sourceOf = ({ editionId, everyChannelDb }: PlanInputs['draft']) =>
  editionId === null ? { everyChannelDb: everyChannelDb ?? 0 } : { editionId };

/** The receiver with the chosen IF, refused where it could not be built. */
function realign(receiver: ReceiverDraft, ifHz: number): ReceiverDraft {
  const { data, error } = receiverDraft.safeParse({ ...receiver, ifHz });
  if (data) return data;
  throw new InvalidError({ path: 'ifHz', message: error.issues[0]?.message ?? 'Give another IF.' });
}
