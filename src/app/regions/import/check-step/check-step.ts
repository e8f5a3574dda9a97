import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { Icon } from '../../../ui/icon/icon';
import { FaultList } from '../fault-list/fault-list';
import { ImportStore } from '../import-store';
import { RemarkList } from '../remark-list/remark-list';
import { RowCounts } from '../row-counts/row-counts';
import { StepHeading } from '../step-heading';

/** Third step: what storing would do, and what is wrong with the rejected rows. */
@Component({
  selector: 'app-check-step',
  imports: [DecimalPipe, FaultList, Icon, MatButtonModule, RemarkList, RowCounts, StepHeading],
  templateUrl: './check-step.html',
  styleUrl: '../step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CheckStep {
  protected readonly list = inject(ImportStore);

  protected readonly rows = computed(() => this.list.state()?.rows ?? null);
  /** Name of the edition that the rows complete; null where they are a list of their own. */
  protected readonly completed = computed(() => {
    const proposal = this.list.state()?.proposal;
    const addsTo = proposal?.addsTo ?? null;
    if (addsTo === null) return null;
    const completes = proposal?.completes;
    return completes?.editionId === addsTo ? completes.label : $localize`the edition`;
  });
  /** Rows that would be stored. */
  protected readonly good = computed(() => {
    const rows = this.rows();
    return rows ? rows.new + rows.changed + rows.same : 0;
  });
}
