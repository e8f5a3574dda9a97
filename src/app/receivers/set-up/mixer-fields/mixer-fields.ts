import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckboxModule } from '@angular/material/checkbox';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { ReceiverControls } from '../receiver-form/controls';

/** What gets past the tuned circuits, and what the mixer makes of it. */
@Component({
  selector: 'app-mixer-fields',
  imports: [MatCheckboxModule, QuantityInput, ReactiveFormsModule],
  templateUrl: './mixer-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MixerFields {
  readonly form = input.required<ReceiverControls>();

  constructor() {
    checkWithForm(this.form);
  }
}
