import { ChangeDetectionStrategy, Component, input, model } from '@angular/core';

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

/** The same rows as a chart, to read and to pick in. The first column names the row. */
@Component({
  selector: 'app-twin-table',
  templateUrl: './twin-table.html',
  styleUrl: './twin-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TwinTable {
  readonly caption = input.required<string>();
  readonly columns = input.required<readonly string[]>();
  readonly rows = input.required<readonly TwinRow[]>();
  readonly picked = model<string | null>(null);
}
