import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';

import type { ReadablePlan } from '../../../../../shared/contracts/plan';
import type { Period } from '../../../../../shared/radio/site';
import { BandStrip } from '../../../charts/band-strip/band-strip';
import { type JudgedBand, loudness } from '../../../charts/band-strip/strip-layout';
import { noiseAt } from '../../trial/surroundings';
import { stationName } from '../plan-words';

/** The dial as the plan found it: a strip for each band. */
@Component({
  selector: 'app-plan-dial',
  template: `
    @for (strip of strips(); track $index) {
      <app-band-strip
        [band]="strip.band"
        [range]="strip.range"
        [stations]="stations()"
        [noise]="noise()"
        [loudness]="loudness()"
        [isLog]="true"
        [(picked)]="picked"
        (working)="working.emit($event)"
      />
    }
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 32px;
    }
  `,
  imports: [BandStrip],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanDial {
  readonly plan = input.required<ReadablePlan>();
  readonly period = input.required<Period>();
  readonly bands = input.required<readonly JudgedBand[]>();
  readonly picked = model<string | null>(null);
  readonly working = output<string>();

  protected readonly loudness = computed(() => loudness(this.bands()));
  protected readonly noise = computed(() => {
    const { site, receiver, ifHz } = this.plan();
    return noiseAt(site, { ...receiver, ifHz });
  });
  protected readonly strips = computed(() =>
    this.bands().flatMap((band, at) => {
      const own = this.plan().receiver.bands[at];
      return own ? { band, range: { low: own.lowHz, high: own.highHz } } : [];
    }),
  );
  /** The stations the plan names, at the fields its responses give. */
  protected readonly stations = computed(() => {
    const fields = new Map<number, number | null>();
    for (const each of this.bands().flatMap(({ responses }) => responses)) {
      if (each.wantedStation !== null) fields.set(each.wantedStation, each.wantedDb);
    }
    for (const each of this.bands().flatMap(({ responses }) => responses)) {
      fields.set(each.station, each.fieldDb);
    }
    return this.plan().stations.map(({ frequencyHz }, id) => ({
      id,
      name: stationName(this.plan(), id),
      frequencyHz,
      fieldDb: fields.get(id) ?? null,
      distanceM: null,
    }));
  });
}
