import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { ReceiverControls } from '../receiver-form/controls';

/** How the aerial is coupled to the first tuned circuit. */
@Component({
  selector: 'app-aerial-fields',
  imports: [MatFormFieldModule, MatSelectModule, QuantityInput, ReactiveFormsModule],
  templateUrl: './aerial-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AerialFields {
  readonly form = input.required<ReceiverControls['controls']['aerial']>();

  constructor() {
    checkWithForm(this.form);
  }
}
