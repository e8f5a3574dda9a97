import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatTableModule } from '@angular/material/table';

import type { ListedStation } from '../../../../shared/contracts/station-list';
import { Icon } from '../../ui/icon/icon';
import { PlacePipe } from '../../ui/place/place-pipe';
import { PowerPipe } from '../power-pipe';

/** Stations of an edition, one row each. */
@Component({
  selector: 'app-station-table',
  imports: [Icon, MatTableModule, PlacePipe, PowerPipe],
  templateUrl: './station-table.html',
  styleUrl: './station-table.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationTable {
  readonly stations = input.required<readonly ListedStation[]>();

  protected readonly columns = ['frequency', 'name', 'callSign', 'place', 'day', 'night', 'note'];
}
