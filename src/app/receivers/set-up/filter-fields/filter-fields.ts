import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { ReceiverControls } from '../receiver-form/controls';

/** A filter that fixes the IF, where one is fitted. */
@Component({
  selector: 'app-filter-fields',
  imports: [
    MatCheckboxModule,
    MatFormFieldModule,
    MatSelectModule,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './filter-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FilterFields {
  readonly form = input.required<ReceiverControls['controls']['fixedFilter']>();

  constructor() {
    checkWithForm(this.form);
  }
}
