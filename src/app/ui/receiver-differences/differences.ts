import { formatFrequency } from '../frequency-pipe';
import { formatQuantity } from '../quantity/quantity';

/** One field that two states of a receiver do not agree on. */
export interface Difference {
  readonly field: string;
  readonly mine: string;
  readonly theirs: string;
}

type Leaf = string | number | boolean;
type Leaves = Map<string, Leaf>;

/** Where two receivers differ, field by field. */
export function differences(mine: object, theirs: object): Difference[] {
  const left = leaves(mine);
  const right = leaves(theirs);
  return [...new Set([...left.keys(), ...right.keys()])]
    .filter((path) => left.get(path) !== right.get(path))
    .map((path) => ({
      field: fieldWords(path),
      mine: valueWords(path, left.get(path)),
      theirs: valueWords(path, right.get(path)),
    }));
}

/** Every field of a receiver that is given, in words. */
export const fieldsInWords = (receiver: object): { field: string; value: string }[] =>
  differences(receiver, {}).map(({ field, mine }) => ({ field, value: mine }));

/** Every single value under its path; what is not given has no path. */
function leaves(value: unknown, path = ''): Leaves {
  if (value === null || value === undefined) return new Map();
  if (typeof value !== 'object') return new Map([[path, value as Leaf]]);
  return new Map(
    Object.entries(value).flatMap(([key, part]) => [
      ...leaves(part, path === '' ? key : `${path}.${key}`),
    ]),
  );
}

const words: Readonly<Record<string, string>> = {
  name: $localize`name`,
  ifHz: $localize`IF`,
  selectivity: $localize`selectivity`,
  b6Hz: $localize`width at −6 dB`,
  b60Hz: $localize`width at −60 dB`,
  audioCornerHz: $localize`audio corner`,
  strayDb: $localize`stray pick-up`,
  if: $localize`at the IF`,
  image: $localize`for images`,
  ifFeedthroughDb: $localize`IF feedthrough`,
  signalToOscillatorDb: $localize`signal against oscillator`,
  ifRange: $localize`IF can be moved by`,
  fixedFilter: $localize`fixed filter`,
  bfo: $localize`BFO`,
  trap: $localize`wave trap`,
  bands: $localize`band`,
  lowHz: $localize`from`,
  highHz: $localize`to`,
  oscillator: $localize`oscillator`,
  service: $localize`listened to for`,
  circuits: $localize`circuit`,
  qLow: $localize`Q at the low end`,
  qHigh: $localize`Q at the high end`,
  centreHz: $localize`centre`,
  widthHz: $localize`width`,
  rangeHz: $localize`reach`,
  pitchHz: $localize`pitch`,
  kind: $localize`kind`,
  aerial: $localize`aerial`,
  resonanceHz: $localize`resonance`,
  q: $localize`Q`,
  count: $localize`number of transformers`,
  coupling: $localize`coupling kQ`,
  points: $localize`point`,
  offsetHz: $localize`offset`,
  rejectionDb: $localize`rejection`,
  secondConversion: $localize`second conversion`,
  oscillatorHarmonic: $localize`harmonic of the oscillator`,
  assumedWantedDb: $localize`field wanted stations are taken to have`,
  tuningToleranceHz: $localize`tuned as near as`,
  dialStepHz: $localize`ticks of the dial`,
  tracking: $localize`tracking`,
  inductanceH: $localize`coil`,
  capacitanceF: $localize`capacitor`,
  sourceOhms: $localize`source`,
  loadOhms: $localize`load`,
  gangMinF: $localize`gang at least`,
  gangMaxF: $localize`gang at most`,
  strayF: $localize`stray capacitance`,
  trimmer: $localize`trimmer at`,
  fixedPadderF: $localize`fixed padder`,
  alignHz: $localize`aligned at`,
};

/** "bands.0.highHz" reads "band 1, to". */
export function fieldWords(path: string): string {
  return path
    .split('.')
    .map((step) => (/^\d+$/u.test(step) ? ` ${Number(step) + 1}` : `, ${words[step] ?? step}`))
    .join('')
    .replace(/^, /u, '');
}

export function valueWords(path: string, value: Leaf | undefined): string {
  if (value === undefined) return '–';
  if (typeof value !== 'number') return String(value);
  if (path.endsWith('Hz')) return formatFrequency(value);
  if (path.endsWith('F')) return `${formatQuantity(value, 'capacitance')} pF`;
  if (path.endsWith('inductanceH')) return `${formatQuantity(value, 'inductance')} µH`;
  if (path.endsWith('Ohms')) return `${value} Ω`;
  return path.includes('Db') ? `${value} dB` : String(value);
}
