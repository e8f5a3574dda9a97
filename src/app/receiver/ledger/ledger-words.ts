import type { JudgedResponse } from '../../charts/band-strip/strip-layout';
import { decibels, field } from '../../charts/readings';

/** One line of the working in words. */
export interface LedgerLine {
  readonly term: string;
  readonly label: string;
  readonly value: string;
  /** A result, not a step. */
  readonly isSum: boolean;
}

interface Term {
  readonly label: string;
  readonly isField?: boolean;
  readonly isSum?: boolean;
}

const terms: Readonly<Record<string, Term>> = {
  field: { label: $localize`Field of the station at the aerial`, isField: true },
  aerial: { label: $localize`Aerial, against the dial setting` },
  trap: { label: $localize`Wave trap, against the dial setting` },
  mixer: { label: $localize`Mixer, for this product against the wanted one` },
  'signal-order': { label: $localize`Order of the signal` },
  'signal-level': { label: $localize`Level at the mixer, for the higher order` },
  'second-conversion': { label: $localize`Second conversion` },
  'stray-limit': { label: $localize`No less than by stray pick-up`, isField: true },
  interference: { label: $localize`Interference`, isField: true, isSum: true },
  weighting: { label: $localize`Weighting by ear and IF for the beat` },
  'weighted-interference': { label: $localize`Interference as heard`, isField: true, isSum: true },
  wanted: { label: $localize`Wanted station`, isField: true },
  noise: { label: $localize`Noise`, isField: true },
  band: { label: $localize`The band itself, in any set`, isField: true },
  ratio: { label: $localize`Wanted to unwanted`, isSum: true },
  'protection-ratio': { label: $localize`Protection ratio asked for` },
  margin: { label: $localize`Margin`, isSum: true },
  uncertainty: { label: $localize`Uncertainty, one sigma` },
};

function termOf(name: string): Term {
  const circuit = /^circuit-(\d+)$/.exec(name)?.[1];
  if (circuit) return { label: $localize`Signal circuit ${circuit}:number:` };
  return terms[name] ?? { label: name };
}

/** The working of a response, in the order in which it is computed. */
export const ledgerLines = ({ ledger }: Pick<JudgedResponse, 'ledger'>): LedgerLine[] =>
  ledger.map(({ term, valueDb }) => {
    const { label, isField = false, isSum = false } = termOf(term);
    return { term, label, value: isField ? field(valueDb) : decibels(valueDb), isSum };
  });
