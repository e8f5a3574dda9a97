import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { Icon } from '../../../ui/icon/icon';
import { FaultList } from '../fault-list/fault-list';
import { ImportStore } from '../import-store';
import { RowCounts } from '../row-counts/row-counts';
import { StepHeading } from '../step-heading';

/** Third step: what storing would do, and what is wrong with the rejected rows. */
@Component({
  selector: 'app-check-step',
  imports: [DecimalPipe, FaultList, Icon, MatButtonModule, RowCounts, StepHeading],
  templateUrl: './check-step.html',
  styleUrl: '../step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CheckStep {
  protected readonly list = inject(ImportStore);

  protected readonly rows = computed(() => this.list.state()?.rows ?? null);
  /** Rows that would be stored. */
  protected readonly good = computed(() => {
    const rows = this.rows();
    return rows ? rows.new + rows.changed + rows.same : 0;
  });
}
