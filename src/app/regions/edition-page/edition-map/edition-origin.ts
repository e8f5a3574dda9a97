import { computed, Injectable, type Signal, signal } from '@angular/core';

import type { Edition } from '../../../../../shared/contracts/region';
import type { Period } from '../../../../../shared/radio/site';
import type { ChartOrigin, OriginFact } from '../../../charts/chart/chart-origin';

interface Basis {
  readonly edition: Edition;
  readonly site: string | null;
  readonly period: Period;
}

/** What the map of an edition rests on: list, site, time. */
@Injectable()
export class EditionOrigin implements ChartOrigin {
  private readonly basis = signal<Signal<Basis> | null>(null);

  readonly facts = computed((): OriginFact[] => {
    const basis = this.basis()?.();
    if (!basis) return [];
    const { edition, site, period } = basis;
    const list = `${edition.regionName}, ${edition.label}, ${edition.date}`;
    const stations = { label: $localize`Stations`, value: list };
    if (site === null) return [stations];
    const time = period === 'day' ? $localize`day` : $localize`night`;
    return [
      stations,
      { label: $localize`Site`, value: site },
      { label: $localize`Time`, value: time },
    ];
  });

  about(basis: Signal<Basis>): void {
    this.basis.set(basis);
  }
}
