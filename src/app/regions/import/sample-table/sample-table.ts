import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { ImportProposal } from '../../../../../shared/contracts/list-import';
import { delimiterWords } from '../list-words';

const ROWS = 5;

/** What was found in the file: how it is written, and its first rows as they are read. */
@Component({
  selector: 'app-sample-table',
  templateUrl: './sample-table.html',
  styleUrl: './sample-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SampleTable {
  readonly proposal = input.required<ImportProposal>();

  protected readonly delimiter = computed(() => delimiterWords(this.proposal().delimiter));
  protected readonly mark = computed(() =>
    this.proposal().decimalMark === ',' ? 'comma' : 'point',
  );
  protected readonly rows = computed(() => this.proposal().sample.slice(0, ROWS));
}
