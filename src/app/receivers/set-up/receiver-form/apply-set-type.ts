import type { AbstractControl } from '@angular/forms';

import { type SetType, typicalCircuits, typicalReceiver } from '../../../core/set-types';
import { circuitControls, type ReceiverControls } from './controls';
import { fieldsOf, writeFields } from './fields';

/** Fills in what is typical of a type of set, and leaves alone what the user has changed. */
export function applySetType(form: ReceiverControls, type: SetType): void {
  const typical = fieldsOf(typicalReceiver(type));
  const { bands, ifHz, selectivity, strayDb, signalToOscillatorDb, aerial } = form.controls;
  const isUntouched = bands.pristine;
  if (isUntouched) writeFields(form, { bands: typical.bands });
  else applyCircuits(form, type);
  for (const [control, value] of [
    [ifHz, typical.ifHz],
    [selectivity, typical.selectivity],
    [strayDb, typical.strayDb],
    [signalToOscillatorDb, typical.signalToOscillatorDb],
    [aerial, typical.aerial],
  ] as const) {
    if (control.pristine) (control as AbstractControl).patchValue(value);
  }
}

/** Gives every band whose circuits are not the user's own those of the type at its frequencies. */
export function applyCircuits(form: ReceiverControls, type: SetType): void {
  for (const { controls } of form.controls.bands.controls) {
    const { value: low } = controls.lowHz;
    const { value: high } = controls.highHz;
    if (low === null || high === null || controls.circuits.dirty) continue;
    const circuits = typicalCircuits(type, low, high);
    if (JSON.stringify(circuits) === JSON.stringify(controls.circuits.value)) continue;
    controls.circuits.clear({ emitEvent: false });
    circuits.forEach(({ qLow, qHigh }) => {
      controls.circuits.push(circuitControls(qLow, qHigh), { emitEvent: false });
    });
    controls.circuits.updateValueAndValidity();
  }
}
