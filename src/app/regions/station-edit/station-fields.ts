import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';

import { checkWithForm } from '../../ui/form-problems/check-with-form';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { formatCoordinate } from '../../ui/place/coordinate';
import { parsePlace } from '../../ui/place/place';
import { QuantityInput } from '../../ui/quantity/quantity-input';
import type { StationForm } from './station-form';

/** The fields of a station: what it is called, where it lies, what it radiates. */
@Component({
  selector: 'app-station-fields',
  imports: [
    MatFormFieldModule,
    MatInputModule,
    ProblemTextPipe,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './station-fields.html',
  styleUrl: './station-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationFields {
  readonly form = input.required<StationForm>();

  /** A short cut that fills in the two coordinates; no field of the station itself. */
  protected readonly pair = new FormControl('', {
    nonNullable: true,
    validators: ({ value }: { value: string }) => {
      const reading = parsePlace(value);
      return 'problem' in reading ? reading : null;
    },
  });

  constructor() {
    checkWithForm(this.form);
    this.pair.valueChanges.pipe(takeUntilDestroyed()).subscribe((text) => {
      this.fillIn(text);
    });
  }

  private fillIn(text: string): void {
    const reading = parsePlace(text);
    if ('problem' in reading || reading.place === null) return;
    const { latitude, longitude } = reading.place;
    this.form().controls.station.patchValue({
      latitude: formatCoordinate(latitude, 'latitude'),
      longitude: formatCoordinate(longitude, 'longitude'),
    });
    this.form().markAsDirty();
  }
}
