import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';

import type { Candidate } from '../../../../shared/contracts/candidates';
import { kilohertz } from '../../charts/readings';
import { TrialStore } from '../trial/trial-store';
import { periodRows } from './period-rows';

/** The IF on trial by day beside by night. */
@Component({
  selector: 'app-day-and-night',
  templateUrl: './day-and-night.html',
  styleUrl: './day-and-night.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DayAndNight {
  private readonly store = inject(TrialStore);

  readonly candidate = input.required<Candidate>();

  protected readonly frequency = computed(() => kilohertz(this.candidate().ifHz));
  protected readonly rows = computed(() => {
    // Of several sites the worst counts, and its stations are not those of this page's list.
    const isOneSite = !this.store.setup()?.others?.length;
    return periodRows(this.candidate(), isOneSite ? this.store.nameOf : null);
  });
}
