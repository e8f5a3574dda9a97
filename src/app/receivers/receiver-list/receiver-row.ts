import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { RouterLink } from '@angular/router';

import type { StoredReceiver } from '../../../../shared/contracts/receiver';
import { FrequencyPipe } from '../../ui/frequency-pipe';
import { Icon } from '../../ui/icon/icon';

/** One receiver of the list, and what can be done with it. */
@Component({
  selector: 'app-receiver-row',
  imports: [DatePipe, FrequencyPipe, Icon, MatButtonModule, MatMenuModule, RouterLink],
  templateUrl: './receiver-row.html',
  styleUrl: './receiver-row.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReceiverRow {
  readonly receiver = input.required<StoredReceiver>();

  readonly duplicate = output();
  readonly remove = output();
}
