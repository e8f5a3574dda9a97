import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  model,
} from '@angular/core';
import { MatPaginatorModule, type PageEvent } from '@angular/material/paginator';

import { Printing } from '../chart/printing';

const PAGE = 200;

/** The rows of a chart as text: one for each mark, in the marks' order. */
export interface TwinRow {
  readonly id: string;
  readonly cells: readonly string[];
}

/** The rows of a chart under their heads. */
export interface ChartTable {
  readonly columns: readonly string[];
  readonly rows: readonly TwinRow[];
}

/**
 * The same rows as a chart, to read and to pick in; many in pages, all of them on paper. The first
 * column names the row.
 */
@Component({
  selector: 'app-twin-table',
  templateUrl: './twin-table.html',
  styleUrl: './twin-table.scss',
  imports: [MatPaginatorModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TwinTable {
  readonly caption = input.required<string>();
  readonly columns = input.required<readonly string[]>();
  readonly rows = input.required<readonly TwinRow[]>();
  readonly picked = model<string | null>(null);

  private readonly printing = inject(Printing);
  protected readonly pageSize = PAGE;
  protected readonly isPaged = computed(() => this.rows().length > PAGE && !this.printing.isOn());
  /** The page that holds what is picked, until another is asked for. */
  protected readonly page = linkedSignal(() => {
    const at = this.rows().findIndex(({ id }) => id === this.picked());
    return Math.max(0, Math.floor(at / PAGE));
  });
  protected readonly shown = computed(() => {
    const from = this.page() * PAGE;
    return this.isPaged() ? this.rows().slice(from, from + PAGE) : this.rows();
  });

  protected turn({ pageIndex }: PageEvent): void {
    this.page.set(pageIndex);
  }
}
