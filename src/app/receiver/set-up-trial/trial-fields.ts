import type { ReceiverDraft } from '../../../../shared/contracts/receiver';
import { fieldWords } from '../../ui/receiver-differences/differences';
import type { QuantityName } from '../../ui/quantity/quantity';
import { valueAt } from './changes';
import { isPart, kindOf, partKinds } from './trial-parts';

/** A field of the set-up that can be put on trial. */
export interface TrialField {
  readonly path: string;
  readonly label: string;
  /** How it is typed, or what it is chosen from. */
  readonly entry:
    | { readonly kind: 'quantity'; readonly quantity: QuantityName }
    | { readonly kind: 'choice'; readonly options: readonly string[] }
    | { readonly kind: 'count' };
}

/** Fields that belong together. */
export interface TrialGroup {
  readonly title: string;
  readonly fields: readonly TrialField[];
}

const choices: Readonly<Record<string, readonly string[]>> = {
  oscillator: ['above', 'below'],
  service: ['broadcast', 'beacon', 'marine', 'telegraphy'],
  'trap.kind': ['parallel', 'series'],
  'fixedFilter.kind': ['crystal', 'mechanical', 'ceramic'],
};

/** Has a place of its own on the page, or cannot be tried out: it changes nothing that is heard. */
const leftOut = new Set(['name', 'ifHz', 'tracking', 'points', 'dialStepHz']);

function quantityOf(path: string): QuantityName {
  const last = path.split('.').at(-1) ?? '';
  if (last === 'audioCornerHz' || last === 'pitchHz') return 'tone';
  if (last.endsWith('Hz')) return 'frequency';
  if (last === 'assumedWantedDb') return 'field';
  if (last.endsWith('Db') || path.startsWith('strayDb.')) return 'decibels';
  if (last === 'ifRange') return 'percent';
  if (last === 'inductanceH') return 'inductance';
  if (last === 'capacitanceF') return 'capacitance';
  return last.endsWith('Ohms') ? 'resistance' : 'plain';
}

function entryOf(path: string): TrialField['entry'] {
  const options = choices[path] ?? choices[path.split('.').at(-1) ?? ''];
  if (options) return { kind: 'choice', options };
  return { kind: 'quantity', quantity: quantityOf(path) };
}

function fieldsUnder(receiver: ReceiverDraft, path: string): TrialField[] {
  const last = path.split('.').at(-1) ?? '';
  if (leftOut.has(last)) return path === 'secondConversion.ifHz' ? [field(path)] : [];
  if (last === 'kind' && isPart(path.split('.')[0] ?? '') && choices[path] === undefined) return [];
  const value = valueAt(receiver, path);
  const parts =
    typeof value === 'object' && value !== null
      ? Object.keys(value).flatMap((key) => fieldsUnder(receiver, `${path}.${key}`))
      : [];
  if (isPart(path)) {
    const now = kindOf(receiver, path);
    const options: readonly string[] = [...new Set<string>([...partKinds[path], now])];
    return [{ path, label: fieldWords(path), entry: { kind: 'choice', options } }, ...parts];
  }
  if (last === 'circuits') {
    return [{ path, label: $localize`number of circuits`, entry: { kind: 'count' } }, ...parts];
  }
  return parts.length > 0 ? parts : [field(path)];
}

const field = (path: string): TrialField => ({
  path,
  label: fieldWords(path),
  entry: entryOf(path),
});

/** Every field of a receiver that can be tried out, in the order of the signal's way. */
export function trialGroups(receiver: ReceiverDraft): TrialGroup[] {
  const under = (...paths: string[]) => paths.flatMap((path) => fieldsUnder(receiver, path));
  const bands = receiver.bands.map(({ name }, at) => ({
    title: name,
    fields: Object.keys(receiver.bands[at] ?? {})
      .flatMap((key) => fieldsUnder(receiver, `bands.${at}.${key}`))
      // The group's title says which band it is.
      .map((each) => ({
        ...each,
        label: each.label.replace(fieldWords(`bands.${at}`), '').replace(/^, /, ''),
      })),
  }));
  return [
    { title: $localize`Aerial and stray pick-up`, fields: under('aerial', 'trap', 'strayDb') },
    ...bands,
    {
      title: $localize`Mixer`,
      fields: under('ifFeedthroughDb', 'signalToOscillatorDb', 'secondConversion'),
    },
    {
      title: $localize`IF amplifier, BFO and audio`,
      fields: under('selectivity', 'ifRange', 'fixedFilter', 'bfo', 'audioCornerHz'),
    },
  ];
}
