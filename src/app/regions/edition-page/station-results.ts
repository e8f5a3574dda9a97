import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatPaginatorModule, type PageEvent } from '@angular/material/paginator';
import { MatSelectModule } from '@angular/material/select';

import { Empty } from '../../ui/page-state/empty';
import { isFiltered, type Order, orderOf } from '../edition-address';
import type { StationPage } from '../edition-store';
import { ORDERS, ORDERS_AT_SITE, orderWords } from './order-words';
import { StationList } from './station-list';
import { StationTable } from './station-table';

/** A page of the stations that were found, in what order, and the way to the other pages. */
@Component({
  selector: 'app-station-results',
  imports: [
    DecimalPipe,
    Empty,
    MatButtonModule,
    MatFormFieldModule,
    MatPaginatorModule,
    MatSelectModule,
    StationList,
    StationTable,
  ],
  templateUrl: './station-results.html',
  styleUrl: './station-results.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationResults {
  readonly page = input.required<StationPage>();
  readonly isNarrow = input.required<boolean>();
  readonly picked = model<string | null>(null);
  readonly sorted = output<Order>();
  readonly turned = output<PageEvent>();
  /** All filters are to go. */
  readonly cleared = output();

  protected readonly query = computed(() => this.page().query);
  protected readonly order = computed(() => orderOf(this.query()));
  protected readonly isFiltered = computed(() => isFiltered(this.query()));
  protected readonly orders = computed(() =>
    this.query().site === undefined ? ORDERS : ORDERS_AT_SITE,
  );
  protected readonly orderWords = orderWords;
  protected readonly sameOrder = (one: Order, other: Order): boolean =>
    one.sort === other.sort && one.direction === other.direction;
}
