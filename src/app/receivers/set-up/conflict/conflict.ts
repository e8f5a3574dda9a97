import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { bareReceiver, type StoredReceiver } from '../../../../../shared/contracts/receiver';
import type { ReceiverFields } from '../receiver-form/controls';
import { receiverOf } from '../receiver-form/fields';
import { DifferenceTable } from '../../../ui/receiver-differences/difference-table';
import { differences } from '../../../ui/receiver-differences/differences';

/** Somebody else saved first: shows both states and lets the user decide. */
@Component({
  selector: 'app-conflict',
  imports: [DifferenceTable, MatButtonModule],
  templateUrl: './conflict.html',
  styleUrl: './conflict.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Conflict {
  readonly mine = input.required<ReceiverFields>();
  readonly theirs = input.required<StoredReceiver>();

  readonly keepMine = output();
  readonly takeTheirs = output();

  protected readonly differences = computed(() =>
    differences(receiverOf(this.mine()) as object, bareReceiver.parse(this.theirs())),
  );
}
