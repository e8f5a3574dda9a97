import type { FormIssue } from '../../../ui/form-problems/form-issues';
import { formatFrequency } from '../../../ui/frequency-pipe';
import type { ReceiverControls, ReceiverFields } from '../receiver-form/controls';

/** The parts of the set-up that open on demand. */
export type Panel =
  | 'selectivity'
  | 'circuits'
  | 'bands'
  | 'tracking'
  | 'aerial'
  | 'mixer'
  | 'filter'
  | 'bfo'
  | 'trap'
  | 'second';

const panelOfField: Readonly<Record<string, Panel>> = {
  selectivity: 'selectivity',
  audioCornerHz: 'selectivity',
  ifRange: 'selectivity',
  strayDb: 'mixer',
  ifFeedthroughDb: 'mixer',
  signalToOscillatorDb: 'mixer',
  fixedFilter: 'filter',
  bfo: 'bfo',
  trap: 'trap',
  aerial: 'aerial',
  secondConversion: 'second',
};

const panelOfBand: Readonly<Record<string, Panel>> = {
  circuits: 'circuits',
  oscillatorHarmonic: 'bands',
  assumedWantedDb: 'bands',
  tuningToleranceHz: 'bands',
  dialStepHz: 'bands',
  tracking: 'tracking',
};

/** The panel that hides a field, if one does. */
export function panelOf(path: string): Panel | undefined {
  const [part = '', , below] = path.split('.');
  return part === 'bands' ? panelOfBand[below ?? ''] : panelOfField[part];
}

/** The panels that hide what is wrong. */
export const panelsOf = (issues: readonly FormIssue[]): Panel[] =>
  issues.map(({ path }) => panelOf(path)).filter((panel) => panel !== undefined);

/** Whether a panel still holds what came with the type of set. */
export function isUntouched(panel: Panel, { controls }: ReceiverControls): boolean {
  if (panel === 'selectivity') return controls.selectivity.pristine;
  if (panel === 'mixer') return controls.strayDb.pristine;
  if (panel === 'aerial') return controls.aerial.pristine;
  return (
    panel === 'circuits' && controls.bands.controls.every((row) => row.controls.circuits.pristine)
  );
}

/** What a closed panel holds, in a few words. */
export function summaries(fields: ReceiverFields): Record<Panel, string> {
  const { selectivity, strayDb, fixedFilter, bfo, trap, aerial, secondConversion, bands } = fields;
  const none = $localize`none`;
  return {
    selectivity: selectivityWords(selectivity),
    circuits: circuits(bands),
    mixer: strayDb.fitted
      ? $localize`at most ${strayDb.if ?? '…'}:if: dB at the IF, ${strayDb.image ?? '…'}:image: dB for images`
      : $localize`no limit by stray pick-up`,
    filter: fixedFilter.fitted ? frequency(fixedFilter.centreHz) : none,
    bfo: bfo.fitted ? frequency(bfo.centreHz) : none,
    trap: trap.fitted ? $localize`fitted` : none,
    aerial: aerialWords(aerial),
    second: secondConversion.fitted ? frequency(secondConversion.ifHz) : none,
    bands: harmonics(bands),
    tracking: trackings(bands),
  };
}

const frequency = (hz: number | null): string => (hz === null ? '…' : formatFrequency(hz));

function selectivityWords(fields: ReceiverFields['selectivity']): string {
  const { kind, b6Hz, b60Hz, count, q, points } = fields;
  if (kind === 'transformers') {
    return $localize`${count ?? '…'}:count: IF transformers of Q ${q ?? '…'}:q:`;
  }
  return kind === 'table'
    ? $localize`a measured curve of ${points.length}:count: points`
    : $localize`${frequency(b6Hz)}:b6: at −6 dB, ${frequency(b60Hz)}:b60: at −60 dB`;
}

function trackings(bands: ReceiverFields['bands']): string {
  const known = bands.filter(({ tracking }) => tracking.fitted).length;
  if (known === 0) return $localize`taken as perfect`;
  return known === bands.length
    ? $localize`known on every band`
    : $localize`known on ${known}:known: of ${bands.length}:all: bands`;
}

function aerialWords({ kind, resonanceHz }: ReceiverFields['aerial']): string {
  if (kind === 'loop') return $localize`loop or ferrite rod`;
  if (kind === 'plain') return $localize`primary not known`;
  return $localize`primary resonant on ${frequency(resonanceHz)}:resonance:`;
}

function harmonics(bands: ReceiverFields['bands']): string {
  return bands.some(({ oscillatorHarmonic }) => (oscillatorHarmonic ?? 1) > 1)
    ? $localize`a harmonic of the oscillator on some`
    : $localize`the oscillator’s fundamental on all`;
}

function circuits(bands: ReceiverFields['bands']): string {
  const counts = [...new Set(bands.map((band) => band.circuits.length))];
  return counts.length === 1
    ? $localize`${counts[0] ?? 0}:count: on every band`
    : $localize`${Math.min(...counts)}:least: to ${Math.max(...counts)}:most:, by band`;
}
