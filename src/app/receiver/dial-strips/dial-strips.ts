import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';

import { ifHarmonics } from '../../../../shared/radio/mixing/harmonic-whistles';
import type { Receiver } from '../../../../shared/radio/receiver';
import { BandStrip } from '../../charts/band-strip/band-strip';
import { type JudgedBand, loudness } from '../../charts/band-strip/strip-layout';
import { type StationAtSite } from '../../charts/choice-chart/choice-layout';
import { type Window } from '../../charts/zoom-window';
import { disturbanceSentence } from './disturbance-words';

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
  readonly isLog = model(true);
  readonly picked = model<string | null>(null);
  /** Dial setting pointed at, hertz. */
  readonly pointerHz = model<number | null>(null);
  readonly pointerSettled = output();
  /** The set is being judged anew: what stands over the strips meanwhile. */
  readonly awaited = input<string | null>(null);
  /** The window of the band at a place; null: the whole of it. */
  readonly windowOf = input<(at: number) => Window | null>(() => null);
  readonly zoomed = output<{ readonly at: number; readonly window: Window | null }>();
  readonly working = output<string>();

  protected readonly loudness = computed(() => loudness(this.bands()));
  protected readonly windows = computed(() => this.bands().map((_, at) => this.windowOf()(at)));
  protected readonly strips = computed(() =>
    this.bands().flatMap((band, at) => {
      const own = this.receiver().bands[at];
      if (!own) return [];
      const { lowHz, highHz } = own;
      const { bfo } = this.receiver();
      return {
        at,
        band,
        range: { low: lowHz, high: highHz },
        beatHarmonics: bfo ? ifHarmonics(bfo.centreHz, lowHz, highHz) : [],
        disturbs: disturbanceSentence(band.oscillatorHz, this.stations(), this.noise()),
      };
    }),
  );
}
