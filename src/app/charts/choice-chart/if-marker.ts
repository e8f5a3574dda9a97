import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';

import { MovedAlong } from '../moved-along';
import { kilohertz } from '../readings';

/** The IF on trial: a slider on the chart's upper edge, moved by pointer or keys. */
@Component({
  selector: 'app-if-marker',
  template: `{{ text() }}`,
  styleUrl: './if-marker.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  hostDirectives: [
    {
      directive: MovedAlong,
      inputs: ['scale', 'frame', 'limits', 'hz: ifHz'],
      outputs: ['hzChange: ifHzChange', 'settled'],
    },
  ],
  host: { 'aria-label': $localize`IF on trial` },
})
export class IfMarker {
  private readonly marker = inject(MovedAlong);

  protected readonly text = computed(() => kilohertz(this.marker.hz()));

  constructor() {
    this.marker.steps = { hz: 500, fineHz: 100 };
  }
}
