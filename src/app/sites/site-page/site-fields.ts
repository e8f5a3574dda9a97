import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';

import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { ITU_REGIONS, ituWords } from '../../ui/itu-regions';
import { formatCoordinate } from '../../ui/place/coordinate';
import { parsePlace } from '../../ui/place/place';
import type { SiteForm } from '../site-form';
import { SurroundingFields } from './surrounding-fields';

/** The fields of a site: what it is called, where it lies, what surrounds it. */
@Component({
  selector: 'app-site-fields',
  imports: [
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
    ProblemTextPipe,
    ReactiveFormsModule,
    SurroundingFields,
  ],
  templateUrl: './site-fields.html',
  styleUrl: './fieldset.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SiteFields {
  readonly form = input.required<SiteForm>();

  protected readonly ituRegions = ITU_REGIONS;
  protected readonly ituWords = ituWords;
  /** A short cut that fills in the two coordinates; no field of the site itself. */
  protected readonly pair = new FormControl('', {
    nonNullable: true,
    validators: ({ value }: { value: string }) => {
      const reading = parsePlace(value);
      return 'problem' in reading ? reading : null;
    },
  });

  constructor() {
    this.pair.valueChanges.pipe(takeUntilDestroyed()).subscribe((text) => {
      this.fillIn(text);
    });
  }

  private fillIn(text: string): void {
    const reading = parsePlace(text);
    if ('problem' in reading || reading.place === null) return;
    const { latitude, longitude } = reading.place;
    this.form().patchValue({
      latitude: formatCoordinate(latitude, 'latitude'),
      longitude: formatCoordinate(longitude, 'longitude'),
    });
    this.form().markAsDirty();
  }
}
