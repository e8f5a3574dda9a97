import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { ReceiverControls } from '../receiver-form/controls';

/** The second mixer of a double superheterodyne, where there is one. */
@Component({
  selector: 'app-second-conversion-fields',
  imports: [
    MatCheckboxModule,
    MatFormFieldModule,
    MatSelectModule,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './second-conversion-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SecondConversionFields {
  readonly form = input.required<ReceiverControls['controls']['secondConversion']>();

  constructor() {
    checkWithForm(this.form);
  }
}
