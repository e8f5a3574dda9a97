import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';

import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Icon } from '../../ui/icon/icon';
import { QuantityField } from '../../ui/quantity/quantity-field';
import { addRange, type RegionForm, removeRange } from '../region-form';

/** The ranges of a region's raster, one row each. */
@Component({
  selector: 'app-raster-fields',
  imports: [
    Icon,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    ProblemTextPipe,
    QuantityField,
    ReactiveFormsModule,
  ],
  templateUrl: './raster-fields.html',
  styleUrl: './raster-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RasterFields {
  readonly form = input.required<RegionForm>();

  protected nameOf(index: number): string {
    return $localize`Range ${index + 1}:number:`;
  }

  protected add(): void {
    addRange(this.form());
  }

  protected remove(index: number): void {
    removeRange(this.form(), index);
  }
}
