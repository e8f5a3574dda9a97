import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckboxModule } from '@angular/material/checkbox';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { ReceiverControls } from '../receiver-form/controls';

/** The beat oscillator, where one is fitted. */
@Component({
  selector: 'app-bfo-fields',
  imports: [MatCheckboxModule, QuantityInput, ReactiveFormsModule],
  templateUrl: './bfo-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BfoFields {
  readonly form = input.required<ReceiverControls['controls']['bfo']>();

  constructor() {
    checkWithForm(this.form);
  }
}
