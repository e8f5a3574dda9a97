import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { startWith, switchMap } from 'rxjs';

import type { SuppliedRaster } from '../../../../shared/contracts/raster';
import { checkWithForm } from '../../ui/form-problems/check-with-form';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Icon } from '../../ui/icon/icon';
import { addRaster, type RegionForm, removeRaster } from '../region-form';
import { RangeFields } from './range-fields';

/** The rasters of a region, each with the day from which it holds, and those that are offered. */
@Component({
  selector: 'app-raster-fields',
  imports: [
    Icon,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    ProblemTextPipe,
    RangeFields,
    ReactiveFormsModule,
  ],
  templateUrl: './raster-fields.html',
  styleUrl: './raster-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RasterFields {
  readonly form = input.required<RegionForm>();
  /** Rasters that come with the product. */
  readonly supplied = input<readonly SuppliedRaster[]>([]);

  private readonly ituRegion = toSignal(
    toObservable(this.form).pipe(
      switchMap(({ controls: { ituRegion } }) =>
        ituRegion.valueChanges.pipe(startWith(ituRegion.value)),
      ),
    ),
  );
  /** Those of the ITU Region chosen. */
  protected readonly offered = computed(() => {
    const chosen = this.ituRegion() ?? null;
    return this.supplied().filter(
      ({ ituRegions }) => chosen !== null && ituRegions.includes(chosen),
    );
  });

  constructor() {
    checkWithForm(this.form);
  }

  protected nameOf(index: number): string {
    return $localize`Raster ${index + 1}:number:`;
  }

  protected add(raster?: SuppliedRaster): void {
    addRaster(this.form(), raster);
  }

  protected remove(index: number): void {
    removeRaster(this.form(), index);
  }
}
