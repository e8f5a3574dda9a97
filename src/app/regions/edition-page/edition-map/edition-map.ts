import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  model,
  output,
} from '@angular/core';

import type { Edition } from '../../../../../shared/contracts/region';
import type { StoredSite } from '../../../../../shared/contracts/site';
import type { StationQuery } from '../../../../../shared/contracts/station-list';
import { ChartOrigin } from '../../../charts/chart/chart-origin';
import { StationMap } from '../../../charts/station-map/station-map';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { EditionStore } from '../../edition-store';
import { EditionOrigin } from './edition-origin';
import { mapSentence, mapStations, mapTable, placeReadout, sizesFor } from './map-words';

/** The stations that the filter finds, on the map; what is chosen is chosen in the table as well. */
@Component({
  selector: 'app-edition-map',
  imports: [Loading, ProblemNote, StationMap],
  providers: [EditionOrigin, { provide: ChartOrigin, useExisting: EditionOrigin }],
  templateUrl: './edition-map.html',
  styleUrl: './edition-map.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EditionMap {
  private readonly store = inject(EditionStore);
  private readonly origin = inject(EditionOrigin);

  readonly edition = input.required<Edition>();
  readonly query = input.required<StationQuery>();
  readonly site = input<StoredSite | null>(null);
  /** Date and hour of the line between day and night, UTC, as an input holds it. */
  readonly hour = input<string | null>(null);
  readonly picked = model<string | null>(null);
  readonly hourChange = output<string | null>();
  /** Id of the station that is to be opened. */
  readonly entered = output<string>();

  protected readonly places = this.store.places(() => `${this.edition().id}`, this.query);
  protected readonly leadsOn = $localize`Enter opens the station.`;
  private readonly items = computed(() => this.places.value()?.items ?? []);
  private readonly byId = computed(() => new Map(this.items().map((each) => [`${each.id}`, each])));
  protected readonly isAtSite = computed(() => this.query().site !== undefined);
  protected readonly stations = computed(() => mapStations(this.items(), this.isAtSite()));
  protected readonly sizes = computed(() => sizesFor(this.isAtSite()));
  protected readonly describe = (id: string) => {
    const place = this.byId().get(id);
    return place && placeReadout(place);
  };
  protected readonly table = () => mapTable(this.items());
  protected readonly at = computed(() => {
    const at = new Date(`${this.hour() ?? ''}Z`);
    return Number.isNaN(at.getTime()) ? null : at;
  });
  protected readonly middle = computed(() => {
    const site = this.site();
    return site?.latitude == null || site.longitude === null
      ? null
      : { name: site.name, latitude: site.latitude, longitude: site.longitude };
  });
  protected readonly sentence = computed(() => {
    const found = this.places.value();
    return found ? mapSentence(found, this.site()?.name ?? null, this.query().period) : '';
  });
  protected readonly chosen = computed(() => {
    const id = this.picked();
    return id === null ? undefined : this.byId().get(id);
  });

  constructor() {
    this.origin.about(
      computed(() => ({
        edition: this.edition(),
        site: this.site()?.name ?? null,
        period: this.query().period,
      })),
    );
  }
}
