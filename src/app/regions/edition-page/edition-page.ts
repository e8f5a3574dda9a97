import { BreakpointObserver } from '@angular/cdk/layout';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import type { PageEvent } from '@angular/material/paginator';
import { ActivatedRoute, type Params, Router, RouterLink } from '@angular/router';
import { map } from 'rxjs';

import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import {
  changeParams,
  isFiltered,
  noFilters,
  type Order,
  stationQueryFrom,
} from '../edition-address';
import { EditionStore } from '../edition-store';
import { EditionHead } from './edition-head';
import { EditionMap } from './edition-map/edition-map';
import { SearchField } from './search-field';
import { StationFilter } from './station-filter/station-filter';
import type { Filter } from './station-filter/filter-form';
import { StationResults } from './station-results';

/** Below this the rows of the table have no room for all they say. */
const NARROW = '(max-width: 60rem)';

/** One edition of a region's list. What is filtered, chosen and shown is in the address. */
@Component({
  selector: 'app-edition-page',
  imports: [
    EditionHead,
    EditionMap,
    Loading,
    MatButtonModule,
    ProblemNote,
    RouterLink,
    SearchField,
    StationFilter,
    StationResults,
  ],
  templateUrl: './edition-page.html',
  styleUrl: './edition-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EditionPage {
  private readonly store = inject(EditionStore);
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);

  readonly id = input.required<string>();

  private readonly address = toSignal(this.route.queryParamMap, { requireSync: true });
  protected readonly query = computed(() => stationQueryFrom(this.address()));
  protected readonly picked = computed(() => this.address().get('station'));
  /** When day and night are shown on the map. */
  protected readonly hour = computed(() => this.address().get('hour'));
  protected readonly isMapped = computed(() => this.address().get('map') !== 'off');
  protected readonly isFiltered = computed(() => isFiltered(this.query()));

  protected readonly edition = this.store.one(this.id);
  protected readonly sites = this.store.sites();
  protected readonly site = computed(() =>
    this.sites.value()?.items.find(({ id }) => id === this.query().site),
  );
  protected readonly stations = this.store.stations(this.id, this.query);
  protected readonly isNarrow = toSignal(
    inject(BreakpointObserver)
      .observe(NARROW)
      .pipe(map(({ matches }) => matches)),
    { initialValue: false },
  );
  protected readonly noFilters = noFilters;

  protected find(search: string): void {
    this.go(changeParams({ search, page: undefined }));
  }

  protected filter(filter: Partial<Record<keyof Filter, unknown>>): void {
    const { sort } = this.query();
    const usual = filter.site === undefined && (sort === 'distance' || sort === 'field');
    const order = usual ? { sort: undefined, direction: undefined } : {};
    this.go(changeParams({ ...filter, ...order, page: undefined }));
  }

  protected sort(order: Order): void {
    this.go({ ...changeParams({ ...order, page: undefined }), direction: order.direction });
  }

  protected turn({ pageIndex, pageSize }: PageEvent): void {
    this.go(changeParams({ page: pageIndex + 1, pageSize }));
  }

  protected pick(station: string | null): void {
    this.go({ station });
  }

  protected open(station: string): void {
    void this.router.navigate(['stations', station], {
      relativeTo: this.route,
      queryParamsHandling: 'preserve',
    });
  }

  protected go(queryParams: Params): void {
    void this.router.navigate([], {
      relativeTo: this.route,
      queryParams,
      queryParamsHandling: 'merge',
      replaceUrl: true,
    });
  }
}
