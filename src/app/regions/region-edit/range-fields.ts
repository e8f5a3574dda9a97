import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { checkWithForm } from '../../ui/form-problems/check-with-form';
import { Icon } from '../../ui/icon/icon';
import { QuantityInput } from '../../ui/quantity/quantity-input';
import { addRange, type RasterForm, removeRange } from '../region-form';

/** The ranges of one raster, one row each. */
@Component({
  selector: 'app-range-fields',
  imports: [Icon, MatButtonModule, QuantityInput],
  templateUrl: './range-fields.html',
  styleUrl: './range-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RangeFields {
  readonly form = input.required<RasterForm>();
  /** Path of the ranges in the whole form. */
  readonly path = input.required<string>();

  constructor() {
    checkWithForm(this.form);
  }

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
