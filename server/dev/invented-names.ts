import { pick } from './random.ts';

/** Syllables that read like places and are none that we know of. */
const FIRST = [
  'Ard', 'Bel', 'Brae', 'Cael', 'Cor', 'Dray', 'Dun', 'Elv', 'Fael', 'Gorr', 'Hask', 'Ith', 'Jor',
  'Kelv', 'Lorn', 'Mael', 'Nev', 'Orl', 'Pell', 'Quor', 'Rhun', 'Sael', 'Torv', 'Ulm', 'Vess',
  'Wren', 'Yar', 'Zel',
] as const; // prettier-ignore
const MIDDLE = ['a', 'e', 'i', 'o', 'an', 'en', 'or', 'il', 'um', 'ath'] as const;
const LAST = [
  'bryn', 'dell', 'fell', 'gard', 'holt', 'lund', 'mere', 'moor', 'ness', 'quay', 'reach', 'rock',
  'sedge', 'shaw', 'skerry', 'strand', 'thwaite', 'voe', 'wick', 'wold',
] as const; // prettier-ignore

/** Call signs begin with Q, which the ITU allots to nobody: they can be no station's. */
const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';

const PROGRAMMES = [
  (place: string) => `Radio ${place}`,
  (place: string) => `${place} Sound`,
  (place: string) => `Voice of ${place}`,
  (place: string) => `${place} Home Programme`,
  (place: string) => `${place} Second Programme`,
  (place: string) => `${place} Harbour Radio`,
] as const;

/** Name of a place that does not exist. */
export function inventedPlace(random: () => number): string {
  return pick(random, FIRST) + pick(random, MIDDLE) + pick(random, LAST);
}

/** Name of the n-th station of a place, counted from 0. */
export function stationName(place: string, ordinal: number): string {
  const form = PROGRAMMES[ordinal % PROGRAMMES.length] ?? PROGRAMMES[0];
  const round = Math.floor(ordinal / PROGRAMMES.length);
  return round === 0 ? form(place) : `${form(place)} ${round + 1}`;
}

/** The n-th call sign after a prefix: four letters, 456976 of them, then five. */
export function callSign(prefix: string, ordinal: number): string {
  let text = '';
  let rest = ordinal;
  for (let place = 0; place < 4 || rest > 0; place++) {
    text = LETTERS.charAt(rest % LETTERS.length) + text;
    rest = Math.floor(rest / LETTERS.length);
  }
  return prefix + text;
}
