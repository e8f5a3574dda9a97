import type { JudgedResponse } from '../../charts/band-strip/strip-layout';
import { decibels, field } from '../../charts/readings';

/** One line of the working in words. */
export interface LedgerLine {
  readonly term: string;
  readonly label: string;
  readonly value: string;
  /** How it is computed; empty: it is given. */
  readonly formula: string;
  /** A result, not a step. */
  readonly isSum: boolean;
}

interface Term {
  readonly label: string;
  readonly formula: string;
  readonly isField?: boolean;
  readonly isSum?: boolean;
}

const terms: Readonly<Record<string, Term>> = {
  field: {
    label: $localize`Field of the station at the aerial, E`,
    formula: $localize`ground wave, ITU-R P.368; by night with the sky wave; or as given`,
    isField: true,
  },
  aerial: {
    label: $localize`Aerial, against the dial setting`,
    formula: $localize`aerial term at the frequency, less that at the dial`,
  },
  trap: {
    label: $localize`Wave trap, against the dial setting`,
    formula: $localize`20 log |1 + Zp/(Rs + RL)|, or across the input, less that at the dial`,
  },
  mixer: {
    label: $localize`Mixer, for this product against the wanted one`,
    formula: 'Hm − Hh + Kn',
  },
  'signal-order': {
    label: $localize`Order of the signal`,
    formula: $localize`(n − 1) times E less all rejection`,
  },
  'signal-level': {
    label: $localize`Level at the mixer, for the higher order`,
    formula: '(n − 1)(r − 80)',
  },
  'second-conversion': {
    label: $localize`Second conversion`,
    formula: $localize`rejection of the first IF`,
  },
  'stray-limit': {
    label: $localize`No less than by stray pick-up`,
    formula: $localize`E less the stray pick-up of the set`,
    isField: true,
  },
  interference: {
    label: $localize`Interference, I`,
    formula: $localize`sum of the lines above, or the stray pick-up where that is more`,
    isField: true,
    isSum: true,
  },
  weighting: {
    label: $localize`Weighting by IF, audio stage and ear for the beat, W`,
    formula: $localize`carrier and sidebands through A(IF), audio and ITU-R BS.468`,
  },
  'weighted-interference': {
    label: $localize`Interference as heard`,
    formula: 'I + W',
    isField: true,
    isSum: true,
  },
  wanted: {
    label: $localize`Wanted station, S`,
    formula: $localize`strongest listed on the dial setting, or assumed for the service`,
    isField: true,
  },
  noise: {
    label: $localize`Noise, N`,
    formula: $localize`man-made noise, ITU-R P.372, in B6; or as given`,
    isField: true,
  },
  band: {
    label: $localize`The band itself, in any set, B`,
    formula: $localize`power sum of Ej + W over neighbours within B60/2`,
    isField: true,
  },
  ratio: { label: $localize`Wanted to unwanted`, formula: 'S − (I + W)', isSum: true },
  'protection-ratio': {
    label: $localize`Protection ratio asked for, P0`,
    formula: $localize`by service and ITU Region`,
  },
  margin: { label: $localize`Margin`, formula: $localize`ratio − P0`, isSum: true },
  uncertainty: {
    label: $localize`Uncertainty, one sigma`,
    formula: $localize`√[(n σf)² + (4 n circuits)² + σw²], own estimate`,
  },
};

const CIRCUIT_FORMULA = $localize`10 log (1 + Q²ρ²), ρ = f/f0 − f0/f, less that at the dial`;

function termOf(name: string): Term {
  const circuit = /^circuit-(\d+)$/.exec(name)?.[1];
  if (circuit) {
    return { label: $localize`Signal circuit ${circuit}:number:`, formula: CIRCUIT_FORMULA };
  }
  return terms[name] ?? { label: name, formula: '' };
}

/** The working of a response, in the order in which it is computed. */
export const ledgerLines = ({ ledger }: Pick<JudgedResponse, 'ledger'>): LedgerLine[] =>
  ledger.map(({ term, valueDb }) => {
    const { label, formula, isField = false, isSum = false } = termOf(term);
    return { term, label, formula, value: isField ? field(valueDb) : decibels(valueDb), isSum };
  });
