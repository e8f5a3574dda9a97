import { ChangeDetectionStrategy, Component, type OnInit, output } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import { debounceTime } from 'rxjs';

import { frequencyHz } from '../../../shared/contracts/quantities';
import type { ItuRegion, NoiseClass, Period } from '../../../shared/radio/site';
import { setTypes } from '../core/set-types';
import { needed, showIssues } from '../ui/form-problems/form-issues';
import { QuantityInput } from '../ui/quantity/quantity-input';
import { type Example, examples } from './examples';
import type { Trial } from './trial';

const PAUSE_MS = 300;

const held = <T>(value: T) => new FormControl(value, { nonNullable: true });

/** The few things a visitor is asked: which kind of set, its IF, and where it stands. */
@Component({
  selector: 'app-trial-fields',
  imports: [
    MatButtonModule,
    MatFormFieldModule,
    MatSelectModule,
    QuantityInput,
    ReactiveFormsModule,
  ],
  templateUrl: './trial-fields.html',
  styleUrl: './trial-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialFields implements OnInit {
  readonly asked = output<Trial>();

  protected readonly types = setTypes;
  protected readonly examples = examples;
  protected readonly form = new FormGroup({
    type: held(examples[0].type),
    ifHz: new FormControl<number | null>(
      examples[0].ifHz,
      needed($localize`Give the IF, say 455 kHz.`),
    ),
    ituRegion: held<ItuRegion>(examples[0].ituRegion),
    noise: held<NoiseClass>('residential'),
    period: held<Period>('night'),
  });

  constructor() {
    this.form.controls.type.valueChanges.pipe(takeUntilDestroyed()).subscribe((type) => {
      const { ifHz } = this.form.controls;
      if (type && ifHz.pristine) ifHz.setValue(type.ifHz);
    });
    this.form.valueChanges.pipe(debounceTime(PAUSE_MS), takeUntilDestroyed()).subscribe(() => {
      this.ask();
    });
  }

  ngOnInit(): void {
    this.ask();
  }

  protected show({ type, ifHz, ituRegion }: Example): void {
    this.form.patchValue({ type, ifHz, ituRegion });
    this.form.controls.ifHz.markAsDirty();
  }

  private ask(): void {
    const { type, ifHz, ...place } = this.form.getRawValue();
    if (type === undefined || ifHz === null) return;
    const checked = frequencyHz.safeParse(ifHz);
    if (checked.success) this.asked.emit({ type, ifHz, ...place });
    else showIssues(this.form, [{ path: 'ifHz', message: checked.error.issues[0]?.message ?? '' }]);
  }
}
