import { BreakpointObserver } from '@angular/cdk/layout';
import { DatePipe, DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { MatPaginatorModule, type PageEvent } from '@angular/material/paginator';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { Router, RouterLink } from '@angular/router';
import { map } from 'rxjs';

import { stationQuery } from '../../../../shared/contracts/station-list';
import { Empty } from '../../ui/page-state/empty';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { EditionStore } from '../edition-store';
import { SearchField } from './search-field';
import { StationList } from './station-list';
import { StationTable } from './station-table';

const NARROW = '(max-width: 44rem)';

/** One edition of a region's list. Page and search are in the address. */
@Component({
  selector: 'app-edition-page',
  imports: [
    DatePipe,
    DecimalPipe,
    Empty,
    Loading,
    MatButtonModule,
    MatPaginatorModule,
    MatProgressBarModule,
    ProblemNote,
    RouterLink,
    SearchField,
    StationList,
    StationTable,
  ],
  templateUrl: './edition-page.html',
  styleUrl: './edition-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EditionPage {
  private readonly store = inject(EditionStore);
  private readonly router = inject(Router);

  readonly id = input.required<string>();
  readonly page = input<string>();
  readonly pageSize = input<string>();
  readonly search = input<string>();

  /** What the address asks for; what makes no sense there is left out. */
  protected readonly query = computed(() => {
    const asked = { page: this.page(), pageSize: this.pageSize(), search: this.search() };
    const parsed = stationQuery.safeParse(asked);
    return parsed.success ? parsed.data : stationQuery.parse({});
  });
  protected readonly edition = this.store.one(this.id);
  protected readonly stations = this.store.stations(this.id, this.query);
  protected readonly isNarrow = toSignal(
    inject(BreakpointObserver)
      .observe(NARROW)
      .pipe(map(({ matches }) => matches)),
    { initialValue: false },
  );

  protected find(search: string): void {
    this.go({ search: search === '' ? null : search, page: null });
  }

  protected turn({ pageIndex, pageSize }: PageEvent): void {
    this.go({ page: pageIndex === 0 ? null : pageIndex + 1, pageSize });
  }

  private go(queryParams: Record<string, string | number | null>): void {
    void this.router.navigate([], { queryParams, queryParamsHandling: 'merge', replaceUrl: true });
  }
}
