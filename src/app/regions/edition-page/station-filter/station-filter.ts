import { ChangeDetectionStrategy, Component, effect, input } from '@angular/core';
import { outputFromObservable } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import { debounceTime, filter, map } from 'rxjs';

import type { StoredSite } from '../../../../../shared/contracts/site';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import { type Filter, filterForm, filterOf, showFilter } from './filter-form';

const PAUSE_MS = 400;

/** Narrows the stations down while one types, once there is a pause. */
@Component({
  selector: 'app-station-filter',
  imports: [
    MatButtonToggleModule,
    MatFormFieldModule,
    MatSelectModule,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './station-filter.html',
  styleUrl: './station-filter.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationFilter {
  readonly query = input.required<Filter>();
  readonly sites = input.required<readonly StoredSite[]>();

  protected readonly form = filterForm();

  readonly filtered = outputFromObservable(
    this.form.valueChanges.pipe(
      debounceTime(PAUSE_MS),
      filter(() => this.form.valid),
      map(() => filterOf(this.form)),
    ),
  );

  constructor() {
    effect(() => {
      showFilter(this.form, this.query());
    });
  }
}
