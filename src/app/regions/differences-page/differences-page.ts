import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatPaginatorModule, type PageEvent } from '@angular/material/paginator';
import { MatSelectModule } from '@angular/material/select';
import { type Params, Router, RouterLink } from '@angular/router';

import {
  type DifferencesAnswer,
  differenceKind,
  differencesQuery,
} from '../../../../shared/contracts/edition-differences';
import { Empty } from '../../ui/page-state/empty';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { EditionStore } from '../edition-store';
import { DifferenceKinds } from './difference-kinds';
import { DifferenceTable } from './difference-table';
import { VerdictSection } from './verdict-section';

/** What changed in an edition against another, and whose verdict is another because of it. */
@Component({
  selector: 'app-differences-page',
  imports: [
    DatePipe,
    DifferenceKinds,
    DifferenceTable,
    Empty,
    Loading,
    MatButtonModule,
    MatFormFieldModule,
    MatPaginatorModule,
    MatSelectModule,
    ProblemNote,
    RouterLink,
    VerdictSection,
  ],
  templateUrl: './differences-page.html',
  styleUrl: './differences-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DifferencesPage {
  private readonly store = inject(EditionStore);
  private readonly router = inject(Router);

  readonly id = input.required<string>();
  readonly against = input<string>();
  readonly kind = input<string>();
  readonly page = input<string>();
  readonly site = input<string>();
  readonly period = input<string>();

  protected readonly edition = this.store.one(this.id);
  protected readonly editions = this.store.ofRegion(() => this.edition.value()?.regionId);

  /** The others of the region, the newest first. */
  protected readonly others = computed(() =>
    (this.editions.value()?.items ?? []).filter(({ id }) => `${id}` !== this.id()),
  );
  /** The one the address names, else the one before, else any. */
  protected readonly other = computed(() => {
    const date = this.edition.value()?.date ?? '';
    return (
      this.others().find(({ id }) => `${id}` === this.against()) ??
      this.others().find((each) => each.date <= date) ??
      this.others()[0]
    );
  });
  protected readonly shownKind = computed(() => differenceKind.safeParse(this.kind()).data);
  private readonly query = computed(() => {
    const against = this.other()?.id;
    const page = differencesQuery.shape.page.safeParse(this.page()).data ?? 1;
    if (against === undefined) return undefined;
    return { against, kind: this.shownKind(), page, pageSize: 50 };
  });
  protected readonly differences = this.store.differences(this.id, this.query);
  protected readonly pageIndex = computed(() => (this.query()?.page ?? 1) - 1);
  /** Whether nothing differs at all. */
  protected isSame({ counts }: DifferencesAnswer): boolean {
    return Object.values(counts).every((count) => count === 0);
  }

  protected turn({ pageIndex }: PageEvent): void {
    this.go({ page: pageIndex === 0 ? null : pageIndex + 1 });
  }

  protected go(queryParams: Params): void {
    void this.router.navigate([], { queryParams, queryParamsHandling: 'merge', replaceUrl: true });
  }
}
