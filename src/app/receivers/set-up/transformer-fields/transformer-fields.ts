import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { SelectivityControls } from '../receiver-form/selectivity-controls';

/** The IF transformers of a set, all alike. */
@Component({
  selector: 'app-transformer-fields',
  imports: [QuantityInput],
  templateUrl: './transformer-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TransformerFields {
  readonly form = input.required<SelectivityControls>();

  constructor() {
    checkWithForm(this.form);
  }
}
