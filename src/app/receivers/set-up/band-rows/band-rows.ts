import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { type FormArray, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { ProblemTextPipe } from '../../../ui/form-problems/problem-text-pipe';
import { Icon } from '../../../ui/icon/icon';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import { bandControls, type BandControls } from '../receiver-form/controls';

const MOST_BANDS = 20;

/** The table of bands: add, remove and reorder rows. */
@Component({
  selector: 'app-band-rows',
  imports: [
    Icon,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
    ProblemTextPipe,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './band-rows.html',
  styleUrl: './band-rows.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BandRows {
  readonly bands = input.required<FormArray<BandControls>>();

  protected readonly most = MOST_BANDS;

  constructor() {
    checkWithForm(this.bands);
  }

  protected add(): void {
    this.bands().push(bandControls());
    this.bands().markAsDirty();
  }

  protected remove(at: number): void {
    this.bands().removeAt(at);
    this.bands().markAsDirty();
  }

  protected move(from: number, to: number): void {
    const row = this.bands().at(from);
    this.bands().removeAt(from, { emitEvent: false });
    this.bands().insert(to, row);
    this.bands().markAsDirty();
  }
}
