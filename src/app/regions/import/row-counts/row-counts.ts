import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { ImportCheck } from '../../../../../shared/contracts/list-import';

/** How many rows are new, changed and so on. */
@Component({
  selector: 'app-row-counts',
  imports: [DecimalPipe],
  template: `
    <dl>
      @for (count of counts(); track count.words) {
        <div [class.none]="count.value === 0">
          <dt>{{ count.words }}</dt>
          <dd>{{ count.value | number }}</dd>
        </div>
      }
    </dl>
  `,
  styleUrl: './row-counts.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RowCounts {
  readonly rows = input.required<ImportCheck['rows']>();

  protected readonly counts = computed(() => {
    const rows = this.rows();
    return [
      { words: $localize`rows in the file`, value: rows.total },
      { words: $localize`new`, value: rows.new },
      { words: $localize`changed`, value: rows.changed },
      { words: $localize`as before`, value: rows.same },
      { words: $localize`said twice`, value: rows.duplicate },
      { words: $localize`rejected`, value: rows.rejected },
      ...[
        { words: $localize`kept from the edition`, value: rows.kept },
        { words: $localize`gone since`, value: rows.gone },
        { words: $localize`read with another row`, value: rows.merged },
        { words: $localize`off the raster`, value: rows.offRaster },
        { words: $localize`without place`, value: rows.withoutPlace },
        { words: $localize`without power`, value: rows.withoutPower },
      ].filter(({ value }) => value > 0),
    ];
  });
}
