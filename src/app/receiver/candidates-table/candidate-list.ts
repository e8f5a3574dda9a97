import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import type { CandidateColumn } from './candidate-columns';

/** A candidate as table and list show it. */
export interface CandidateRow {
  readonly ifHz: number;
  readonly frequency: string;
  readonly deficit: string;
  readonly isReachable: boolean;
  readonly isOnTrial: boolean;
  readonly isPresent: boolean;
  readonly cells: readonly {
    readonly key: string;
    readonly label: string;
    readonly text: string;
  }[];
}

/** The candidates where columns find no room: one under the other, each opened on demand. */
@Component({
  selector: 'app-candidate-list',
  templateUrl: './candidate-list.html',
  styleUrl: './candidate-list.scss',
  imports: [MatButtonModule, MatFormFieldModule, MatSelectModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CandidateList {
  readonly rows = input.required<readonly CandidateRow[]>();
  readonly columns = input.required<readonly CandidateColumn[]>();
  /** Key of the column by which they are sorted; empty: as ranked. */
  readonly sortedBy = input.required<string>();
  readonly sorted = output<string>();
  readonly taken = output<number>();
}
