import { computed, inject, Injectable } from '@angular/core';

import type { Period } from '../../../../shared/radio/site';
import { type ChartOrigin } from '../../charts/chart/chart-origin';
import { kilohertz } from '../../charts/readings';
import { ReceiverStore } from './receiver-store';

const byDayOrNight = (period: Period): string =>
  period === 'day' ? $localize`day` : $localize`night`;

/** What the charts of a receiver's page rest on: set, IF on trial, site, list, time. */
@Injectable()
export class ReceiverOrigin implements ChartOrigin {
  private readonly store = inject(ReceiverStore);

  readonly facts = computed(() => [
    { label: $localize`Receiver`, value: this.store.receiver.value()?.name ?? '' },
    {
      label: $localize`IF on trial`,
      value: $localize`${kilohertz(this.store.trialHz())}:frequency: kHz`,
    },
    { label: $localize`Site`, value: this.store.site()?.name ?? '' },
    { label: $localize`Stations`, value: this.stations() },
    {
      label: $localize`Time`,
      value: this.store.address().at ?? byDayOrNight(this.store.period()),
    },
  ]);

  private stations(): string {
    const { source } = this.store.address();
    if (source?.kind === 'every-channel') {
      return $localize`${source.fieldDb}:field: dB(µV/m) assumed on every channel`;
    }
    const listed = this.store.edition();
    return listed ? `${listed.regionName}, ${listed.label}, ${listed.date}` : '';
  }
}
