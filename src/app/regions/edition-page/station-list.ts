import { ChangeDetectionStrategy, Component, input, model } from '@angular/core';
import { RouterLink } from '@angular/router';

import type { ListedStation } from '../../../../shared/contracts/station-list';
import { distance, field } from '../../charts/readings';
import { FrequencyPipe } from '../../ui/frequency-pipe';
import { PlacePipe } from '../../ui/place/place-pipe';
import { PowerPipe } from '../power-pipe';
import { OfficialValue } from './official-value';
import { StationRemarks } from './station-remarks';

/** Stations of an edition where there is no room for a table. */
@Component({
  selector: 'app-station-list',
  imports: [FrequencyPipe, OfficialValue, PlacePipe, PowerPipe, RouterLink, StationRemarks],
  templateUrl: './station-list.html',
  styleUrl: './station-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationList {
  readonly stations = input.required<readonly ListedStation[]>();
  /** Id of the station chosen here or on the map. */
  readonly picked = model<string | null>(null);

  protected readonly distance = distance;
  protected readonly field = field;
}
