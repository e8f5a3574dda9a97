import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { FormArray } from '@angular/forms';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { BandControls } from '../receiver-form/controls';

/** What is seldom known of a band: the oscillator's harmonic, the wanted field, how it is tuned. */
@Component({
  selector: 'app-band-details',
  imports: [QuantityInput],
  templateUrl: './band-details.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BandDetails {
  readonly bands = input.required<FormArray<BandControls>>();

  constructor() {
    checkWithForm(this.bands);
  }
}
