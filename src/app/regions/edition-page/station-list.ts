import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import type { ListedStation } from '../../../../shared/contracts/station-list';
import { FrequencyPipe } from '../../ui/frequency-pipe';
import { Icon } from '../../ui/icon/icon';
import { PlacePipe } from '../../ui/place/place-pipe';
import { PowerPipe } from '../power-pipe';

/** Stations of an edition where there is no room for a table. */
@Component({
  selector: 'app-station-list',
  imports: [FrequencyPipe, Icon, PlacePipe, PowerPipe],
  templateUrl: './station-list.html',
  styleUrl: './station-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationList {
  readonly stations = input.required<readonly ListedStation[]>();
}
