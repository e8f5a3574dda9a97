import { type AbstractControl, FormArray, FormGroup } from '@angular/forms';

import type { ReceiverDraft } from '../../../../../shared/contracts/receiver';
import { needed } from '../../../ui/form-problems/form-issues';
import { fittedNumber, held, neededWhile, number } from './held';
import { selectivityControls } from './selectivity-controls';
import { trackingControls } from './tracking-controls';

type Band = ReceiverDraft['bands'][number];

const q = () => $localize`Give the loaded Q.`;

export const circuitControls = (qLow: number | null = 80, qHigh: number | null = 80) =>
  new FormGroup({ qLow: number(qLow, q()), qHigh: number(qHigh, q()) });
export type CircuitControls = ReturnType<typeof circuitControls>;

/** A band's row, and what is said of it below. */
export const bandControls = () =>
  new FormGroup({
    name: held('', needed($localize`Name the band, for example Medium wave.`)),
    lowHz: number(null, $localize`Give the frequency where the band begins.`),
    highHz: number(null, $localize`Give the frequency where the band ends.`),
    oscillator: held<Band['oscillator']>('above'),
    circuits: new FormArray<CircuitControls>([circuitControls()]),
    oscillatorHarmonic: number(1, $localize`Give the harmonic, as a rule 1.`),
    service: held<Band['service']>('broadcast'),
    assumedWantedDb: number(null),
    tuningToleranceHz: number(null),
    dialStepHz: number(null),
    tracking: trackingControls(),
  });
export type BandControls = ReturnType<typeof bandControls>;

const strayControls = () =>
  new FormGroup({
    fitted: held(true),
    if: fittedNumber($localize`Give the limit at the IF in dB.`),
    image: fittedNumber($localize`Give the limit for images in dB.`),
  });

const bfoControls = () =>
  new FormGroup({
    fitted: held(false),
    centreHz: fittedNumber($localize`Give the frequency the BFO stands on.`),
    rangeHz: fittedNumber($localize`Give how far the BFO reaches to either side.`),
    pitchHz: fittedNumber($localize`Give the usual pitch, for example 800 Hz.`),
  });

const trapControls = () =>
  new FormGroup({
    fitted: held(false),
    kind: held<'parallel' | 'series'>('parallel'),
    inductanceH: fittedNumber($localize`Give the inductance of the trap's coil.`),
    capacitanceF: fittedNumber($localize`Give the trap's capacitance.`),
    q: fittedNumber($localize`Give the Q of the trap's coil.`),
    sourceOhms: fittedNumber($localize`Give the resistance on the aerial's side.`),
    loadOhms: fittedNumber($localize`Give the resistance on the set's side.`),
  });

const filterControls = () =>
  new FormGroup({
    fitted: held(false),
    kind: held<'crystal' | 'mechanical' | 'ceramic'>('ceramic'),
    centreHz: fittedNumber($localize`Give the filter's centre.`),
    widthHz: fittedNumber($localize`Give the filter's width.`),
  });

const isPrimary = (group: AbstractControl | null): boolean =>
  group?.get('kind')?.value === 'primary';

const aerialControls = () =>
  new FormGroup({
    kind: held<'plain' | 'primary' | 'loop'>('plain'),
    resonanceHz: held<number | null>(
      null,
      neededWhile(
        isPrimary,
        $localize`Give the frequency the primary resonates on, with the aerial.`,
      ),
    ),
    q: held<number | null>(
      null,
      neededWhile(
        isPrimary,
        $localize`Give the Q of the primary, with the usual dummy aerial about 30.`,
      ),
    ),
  });

const secondConversionControls = () =>
  new FormGroup({
    fitted: held(false),
    ifHz: fittedNumber($localize`Give the second IF, for example 85 kHz.`),
    oscillator: held<Band['oscillator']>('above'),
  });

/** Every field of a receiver's set-up, in the order of the page. */
export const receiverControls = () =>
  new FormGroup({
    name: held('', needed($localize`Give the receiver a name.`)),
    ifHz: number(null, $localize`Give the IF, for example 455 kHz.`),
    bands: new FormArray<BandControls>([bandControls()]),
    selectivity: selectivityControls(),
    audioCornerHz: number(3500),
    strayDb: strayControls(),
    ifFeedthroughDb: number(3, $localize`Give the IF feedthrough in dB, as a rule 3.`),
    signalToOscillatorDb: number(-40, $localize`Give the level in dB, for example -40.`),
    ifRange: number(0.06, $localize`Give how far the IF can be moved in %, as a rule 6.`),
    fixedFilter: filterControls(),
    bfo: bfoControls(),
    trap: trapControls(),
    aerial: aerialControls(),
    secondConversion: secondConversionControls(),
  });
export type ReceiverControls = ReturnType<typeof receiverControls>;
/** What stands in the fields, complete or not. */
export type ReceiverFields = ReturnType<ReceiverControls['getRawValue']>;
