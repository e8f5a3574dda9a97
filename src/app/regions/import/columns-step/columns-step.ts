import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';

import { ColumnFields } from '../column-fields/column-fields';
import { ImportStore } from '../import-store';
import { LayoutFields } from '../layout-fields/layout-fields';
import { SampleTable } from '../sample-table/sample-table';
import { StepHeading } from '../step-heading';

/** Second step: how the file is written, and what each of its columns holds. */
@Component({
  selector: 'app-columns-step',
  imports: [ColumnFields, LayoutFields, SampleTable, StepHeading],
  templateUrl: './columns-step.html',
  styleUrl: '../step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ColumnsStep {
  private readonly list = inject(ImportStore);

  protected readonly proposal = computed(() => this.list.state()?.proposal);
  /** Taken apart otherwise, the file has other columns, and the questions are asked anew. */
  protected readonly layouts = computed(() => {
    const proposal = this.proposal();
    if (!proposal) return [];
    const { encoding, delimiter, decimalMark, columns } = proposal;
    const headers = columns.map(({ header }) => header);
    return [JSON.stringify([encoding, delimiter, decimalMark, headers])];
  });
}
