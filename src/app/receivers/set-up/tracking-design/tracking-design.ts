import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { ProblemTextPipe } from '../../../ui/form-problems/problem-text-pipe';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import type { TrackingControls } from '../receiver-form/tracking-controls';

/** Gang, trimmer, padder and points of one band. */
@Component({
  selector: 'app-tracking-design',
  imports: [
    MatFormFieldModule,
    MatSelectModule,
    ProblemTextPipe,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './tracking-design.html',
  styles: `
    .problem {
      color: var(--mat-sys-error);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrackingDesign {
  readonly form = input.required<TrackingControls>();
  /** Path of the group in the whole form. */
  readonly path = input.required<string>();

  protected readonly pointLabels = [
    $localize`Lowest point`,
    $localize`Middle point`,
    $localize`Highest point`,
  ];
  protected readonly alignLabels = [$localize`Aligned low at`, $localize`Aligned high at`];

  constructor() {
    checkWithForm(this.form);
  }
}
