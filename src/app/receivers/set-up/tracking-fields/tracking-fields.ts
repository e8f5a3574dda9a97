import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckboxModule } from '@angular/material/checkbox';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import type { ReceiverControls } from '../receiver-form/controls';
import { TrackingDesign } from '../tracking-design/tracking-design';
import { TrackingParts } from '../tracking-parts/tracking-parts';

/** How the oscillator of each band follows its signal circuits, and which parts that takes. */
@Component({
  selector: 'app-tracking-fields',
  imports: [MatCheckboxModule, ReactiveFormsModule, TrackingDesign, TrackingParts],
  templateUrl: './tracking-fields.html',
  styleUrl: './tracking-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrackingFields {
  readonly form = input.required<ReceiverControls>();

  constructor() {
    checkWithForm(this.form);
  }
}
