import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { ImportCause, ImportFault } from '../../../../../shared/contracts/list-import';
import { groupFaults } from '../fault-groups';

/** Rows shown of one cause; the download has them all. */
const SHOWN = 50;

/** What is wrong, grouped by cause and then row by row. */
@Component({
  selector: 'app-fault-list',
  imports: [DecimalPipe],
  templateUrl: './fault-list.html',
  styleUrl: './fault-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FaultList {
  readonly faults = input.required<readonly ImportFault[]>();
  readonly causes = input<readonly ImportCause[]>([]);

  protected readonly groups = computed(() =>
    groupFaults(this.faults(), this.causes()).map((group) => ({
      ...group,
      shown: group.faults.slice(0, SHOWN),
      left: group.count - Math.min(group.faults.length, SHOWN),
    })),
  );
}
