import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { ReceiverControls } from '../receiver-form/controls';

/** The IF amplifier's two widths and what follows it. */
@Component({
  selector: 'app-selectivity-fields',
  imports: [MatButtonModule, QuantityInput],
  templateUrl: './selectivity-fields.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SelectivityFields {
  readonly form = input.required<ReceiverControls>();

  constructor() {
    checkWithForm(this.form);
  }

  /** B60 over B6, once both are known. */
  protected shapeFactor(): string | null {
    const { b6Hz, b60Hz } = this.form().controls.selectivity.getRawValue();
    return b6Hz !== null && b60Hz !== null && b60Hz > b6Hz ? (b60Hz / b6Hz).toFixed(2) : null;
  }

  protected useWidths(): void {
    const { selectivity } = this.form().controls;
    selectivity.controls.other.setValue(null);
    selectivity.markAsDirty();
  }
}
