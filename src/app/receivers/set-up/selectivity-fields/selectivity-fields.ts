import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import { CurveRows } from '../curve-rows/curve-rows';
import type { ReceiverControls } from '../receiver-form/controls';
import { TransformerFields } from '../transformer-fields/transformer-fields';
import { widthsInWords } from './selectivity-widths';

/** The IF amplifier's selectivity, by whatever is known of it, and what follows it. */
@Component({
  selector: 'app-selectivity-fields',
  imports: [
    CurveRows,
    MatFormFieldModule,
    MatSelectModule,
    QuantityInput,
    ReactiveFormsModule,
    TransformerFields,
  ],
  templateUrl: './selectivity-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SelectivityFields {
  readonly form = input.required<ReceiverControls>();

  constructor() {
    checkWithForm(this.form);
  }

  protected widths(): string | null {
    const { selectivity, ifHz } = this.form().controls;
    return widthsInWords(selectivity.getRawValue(), ifHz.value);
  }
}
