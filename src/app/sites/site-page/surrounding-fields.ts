import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';

import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { QuantityField } from '../../ui/quantity/quantity-field';
import type { SiteForm } from '../site-form';
import { GROUNDS, nameOf, NOISES, wordsOf } from '../surroundings';

/** Ground and noise, each class explained where it is chosen. */
@Component({
  selector: 'app-surrounding-fields',
  imports: [
    MatCheckboxModule,
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
    ProblemTextPipe,
    QuantityField,
    ReactiveFormsModule,
  ],
  templateUrl: './surrounding-fields.html',
  styleUrl: './fieldset.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SurroundingFields {
  readonly form = input.required<SiteForm>();

  protected readonly grounds = GROUNDS;
  protected readonly noises = NOISES;
  protected readonly nameOf = nameOf;
  protected readonly wordsOf = wordsOf;
}
