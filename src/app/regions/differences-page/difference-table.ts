import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { Difference } from '../../../../shared/contracts/edition-differences';
import { FrequencyPipe } from '../../ui/frequency-pipe';
import { differenceLines, kindWords } from './difference-words';

/** Stations that are not the same in both editions, before and after. */
@Component({
  selector: 'app-difference-table',
  imports: [FrequencyPipe],
  templateUrl: './difference-table.html',
  styleUrl: './difference-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DifferenceTable {
  readonly differences = input.required<readonly Difference[]>();

  protected readonly rows = computed(() =>
    this.differences().map((difference, index) => {
      const station = difference.after ?? difference.before;
      const lines = differenceLines(difference);
      return {
        index,
        frequencyHz: station?.frequencyHz ?? 0,
        name: station ? station.name || station.callSign || '–' : '–',
        kinds: difference.kinds.map(kindWords).join(', '),
        lines: lines.length > 0 ? lines : [{ name: '', before: '', after: '', by: '' }],
      };
    }),
  );
}
