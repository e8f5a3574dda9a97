import { computed, inject, Injectable } from '@angular/core';

import { type ChartOrigin } from '../charts/chart/chart-origin';
import { formatFrequency } from '../ui/frequency-pipe';
import { ASSUMED_FIELD_DB } from './trial';
import { TrialStore } from './trial-store';

/** What the charts of the first page rest on: a typical set, and stations assumed everywhere. */
@Injectable()
export class WelcomeOrigin implements ChartOrigin {
  private readonly store = inject(TrialStore);

  readonly facts = computed(() => {
    const trial = this.store.trial();
    if (!trial) return [];
    return [
      { label: $localize`Receiver`, value: trial.type.name },
      { label: $localize`IF on trial`, value: formatFrequency(this.store.trialHz() ?? trial.ifHz) },
      { label: $localize`Site`, value: $localize`ITU Region ${trial.ituRegion}:region:` },
      {
        label: $localize`Stations`,
        value: $localize`${ASSUMED_FIELD_DB}:field: dB(µV/m) assumed on every channel`,
      },
      {
        label: $localize`Time`,
        value: trial.period === 'day' ? $localize`day` : $localize`night`,
      },
    ];
  });
}
