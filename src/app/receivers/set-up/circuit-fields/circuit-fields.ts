import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { FormArray } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { formatFrequency } from '../../../ui/frequency-pipe';
import { Icon } from '../../../ui/icon/icon';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import { type BandControls, circuitControls } from '../receiver-form/controls';

const MOST_CIRCUITS = 12;

/** The tuned signal circuits of every band, each with its loaded Q at both ends. */
@Component({
  selector: 'app-circuit-fields',
  imports: [Icon, MatButtonModule, QuantityInput],
  templateUrl: './circuit-fields.html',
  styleUrl: './circuit-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CircuitFields {
  readonly bands = input.required<FormArray<BandControls>>();

  protected readonly most = MOST_CIRCUITS;

  constructor() {
    checkWithForm(this.bands);
  }

  protected lowLabel(at: number, { controls }: BandControls): string {
    return $localize`Circuit ${at + 1}:number:, Q at ${frequency(controls.lowHz.value)}:low:`;
  }

  protected highLabel({ controls }: BandControls): string {
    return $localize`Q at ${frequency(controls.highHz.value)}:high:`;
  }

  protected add({ controls }: BandControls): void {
    const last = controls.circuits.controls.at(-1)?.getRawValue();
    controls.circuits.push(circuitControls(last?.qLow, last?.qHigh));
    controls.circuits.markAsDirty();
  }

  protected remove({ controls }: BandControls, at: number): void {
    controls.circuits.removeAt(at);
    controls.circuits.markAsDirty();
  }
}

const frequency = (hz: number | null): string => (hz === null ? '…' : formatFrequency(hz));
