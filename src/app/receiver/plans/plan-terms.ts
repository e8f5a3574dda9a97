import type { Plan } from '../../../../shared/contracts/plan';
import type { Period } from '../../../../shared/radio/site';
import { verdictSentences } from '../advice/verdict-words';
import { candidateColumns } from '../candidates-table/candidate-columns';

/** One term of a plan: the IF as it was, and as chosen. */
export interface PlanTerm {
  readonly label: string;
  readonly present: string;
  readonly chosen: string;
}

/** The verdict by day and by night in words; a kept plan names stations by where they are heard. */
export const planVerdicts = ({ results }: Plan): string[] =>
  (['day', 'night'] as const).map((period: Period) =>
    verdictSentences(results[period], undefined, period, () => $localize`a station`).join(' '),
  );

/** Every term of the candidates, for the period the plan was judged in. */
export const planTerms = ({ results, period, receiver }: Plan): PlanTerm[] =>
  candidateColumns(period, receiver).map(({ label, text }) => ({
    label,
    present: text(results.present),
    chosen: text(results.chosen),
  }));
