import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  model,
  output,
  signal,
} from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';

import type { Receiver } from '../../../../shared/radio/receiver';
import { BandStrip } from '../../charts/band-strip/band-strip';
import { type JudgedBand, loudness } from '../../charts/band-strip/strip-layout';
import { type StationAtSite } from '../../charts/choice-chart/choice-layout';

/** The dial of the set: one strip for each band, all with the same scale of levels. */
@Component({
  selector: 'app-dial-strips',
  templateUrl: './dial-strips.html',
  styleUrl: './dial-strips.scss',
  imports: [BandStrip, MatButtonToggleModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DialStrips {
  readonly bands = input.required<readonly JudgedBand[]>();
  readonly receiver = input.required<Receiver>();
  readonly stations = input.required<readonly StationAtSite[]>();
  readonly noise = input.required<(hz: number) => number | null>();
  readonly picked = model<string | null>(null);
  readonly working = output<string>();

  protected readonly isLog = signal(true);
  protected readonly loudness = computed(() => loudness(this.bands()));
  protected readonly strips = computed(() =>
    this.bands().flatMap((band, at) => {
      const own = this.receiver().bands[at];
      return own ? { band, range: { low: own.lowHz, high: own.highHz } } : [];
    }),
  );
}
