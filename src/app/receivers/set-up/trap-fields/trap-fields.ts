import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { ReceiverControls } from '../receiver-form/controls';

/** A wave trap at the aerial terminal, where one is fitted. */
@Component({
  selector: 'app-trap-fields',
  imports: [
    MatCheckboxModule,
    MatFormFieldModule,
    MatSelectModule,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './trap-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrapFields {
  readonly form = input.required<ReceiverControls['controls']['trap']>();

  constructor() {
    checkWithForm(this.form);
  }
}
