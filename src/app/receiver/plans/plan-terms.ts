import type { ReadablePlan } from '../../../../shared/contracts/plan';
import type { Period } from '../../../../shared/radio/site';
import { verdictSentences } from '../advice/verdict-words';
import { candidateColumns } from '../candidates-table/candidate-columns';
import { stationName } from './plan-words';

/** One term of a plan: the IF as it was, and as chosen. */
export interface PlanTerm {
  readonly label: string;
  readonly present: string;
  readonly chosen: string;
}

/** The verdict for a period in words: the set as it was saved, and with the plan. */
export function planVerdicts(plan: ReadablePlan, period: Period) {
  const { results } = plan;
  const words = (verdict: (typeof results)['day']) =>
    verdictSentences(verdict, undefined, period, (place) => stationName(plan, place));
  return {
    before: results.before ? words(results.before[period]) : [],
    after: words(results[period]),
  };
}

/** Every term of the candidates for a period. */
export const planTerms = ({ results, receiver }: ReadablePlan, period: Period): PlanTerm[] =>
  candidateColumns(period, receiver).map(({ label, text }) => ({
    label,
    present: text(results.present),
    chosen: text(results.chosen),
  }));
