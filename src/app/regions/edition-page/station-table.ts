import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import { MatSortModule, type Sort } from '@angular/material/sort';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';

import { type ListedStation, stationSort } from '../../../../shared/contracts/station-list';
import { kilometres, tenths } from '../../charts/readings';
import { factName, type StationFact, writtenFact } from '../correction-words';
import type { Order } from '../edition-address';
import { PowerPipe } from '../power-pipe';
import { OfficialValue } from './official-value';
import { StationRemarks } from './station-remarks';

interface Column {
  readonly fact: StationFact;
  readonly title: string;
  readonly isNumber: boolean;
}

/** Stations of an edition, one row each; sorted by what their heads say. */
@Component({
  selector: 'app-station-table',
  imports: [MatSortModule, MatTableModule, OfficialValue, PowerPipe, RouterLink, StationRemarks],
  templateUrl: './station-table.html',
  styleUrl: './station-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationTable {
  readonly stations = input.required<readonly ListedStation[]>();
  readonly order = input.required<Order>();
  /** Whether a site is chosen, at which distance and field are told. */
  readonly isAtSite = input(false);
  /** Id of the station chosen here or on the map. */
  readonly picked = model<string | null>(null);
  readonly sorted = output<Order>();

  protected readonly columns = computed(() => [
    ...['frequency', 'name', 'callSign', 'place', 'day', 'night'],
    ...(this.isAtSite() ? ['distance', 'field'] : []),
    'note',
  ]);
  /** Columns that only show a fact. */
  protected readonly facts: readonly Column[] = [
    { fact: 'callSign', title: factName('callSign'), isNumber: false },
    { fact: 'place', title: factName('place'), isNumber: false },
    { fact: 'night', title: $localize`by night`, isNumber: true },
  ];
  protected readonly written = writtenFact;
  protected readonly kilometres = kilometres;
  protected readonly tenths = tenths;

  protected sort({ active, direction }: Sort): void {
    const sort = stationSort.safeParse(active);
    if (sort.success) this.sorted.emit({ sort: sort.data, direction: direction || 'asc' });
  }
}
