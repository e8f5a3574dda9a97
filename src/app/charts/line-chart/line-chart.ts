import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';

import { formatFrequency } from '../../ui/frequency-pipe';
import { FrequencyAxis } from '../axis/frequency-axis';
import { dialScale } from '../band-strip/strip-layout';
import { type Curve } from '../curves/curve';
import { CurveChart, type Rule } from '../curves/curve-chart';
import { frame, NARROW } from '../frame';
import { observeWidth } from '../observe-width';
import { kilohertz } from '../readings';
import { type Window } from '../zoom-window';

/**
 * Curves against frequency: rejection along a band, tracking error, a filter's response. Told apart
 * by dash, mark and their names beside them; read by pointer and key, all curves at once; zoomed,
 * shown as a table, saved and printed as every chart.
 *
 *     <app-line-chart
 *       heading="Image rejection"
 *       description="Least at 1600 kHz: 31.2 dB."
 *       levelLabel="rejection, dB"
 *       [range]="{ low: 520000, high: 1600000 }"
 *       [curves]="[
 *         { id: 'now', name: 'as it is', points: [{ at: 520000, level: 52.1 }, …] },
 *         { id: 'measured', name: 'measured', isMeasured: true, points: [{ at: 600000, level: 48 }] },
 *       ]"
 *       [rules]="[{ at: 1000000, text: 'pointer' }]"
 *       [(picked)]="picked"
 *     />
 *
 * `picked` is the frequency read out, as text: `'1600000'`.
 */
@Component({
  selector: 'app-line-chart',
  template: `
    <app-curve-chart
      [heading]="heading()"
      [description]="description()"
      [curves]="curves()"
      [frame]="frame()"
      [wholeScale]="wholeScale()"
      [scale]="scale()"
      [canZoom]="true"
      [alongLabel]="alongLabel()"
      [writeAlong]="write"
      [sayAlong]="say"
      [levelLabel]="levelLabel()"
      [levelUnit]="levelUnit()"
      [rules]="rules()"
      [leadsOn]="leadsOn()"
      [(window)]="window"
      [(picked)]="picked"
      (entered)="entered.emit($event)"
    >
      <svg:g
        appFrequencyAxis
        [scale]="scale()"
        [window]="shown()"
        [length]="frame().innerWidth"
        [label]="axisLabel"
      />
    </app-curve-chart>
  `,
  styles: `
    :host {
      display: block;
    }
  `,
  imports: [CurveChart, FrequencyAxis],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LineChart {
  readonly heading = input.required<string>();
  /** A sentence with the chart's own numbers. */
  readonly description = input.required<string>();
  readonly curves = input.required<readonly Curve[]>();
  /** The whole range along the chart, hertz. */
  readonly range = input.required<{ readonly low: number; readonly high: number }>();
  /** What stands up the chart, with its unit. */
  readonly levelLabel = input.required<string>();
  readonly levelUnit = input('dB');
  readonly alongLabel = input($localize`Frequency, kHz`);
  readonly isLog = input(false);
  readonly height = input(260);
  readonly rules = input<readonly Rule[]>([]);
  /** What Enter does at a frequency, as a sentence; empty: nothing. */
  readonly leadsOn = input('');
  readonly window = model<Window | null>(null);
  readonly picked = model<string | null>(null);
  /** Enter was pressed at this frequency, hertz. */
  readonly entered = output<number>();

  private readonly width = observeWidth();
  protected readonly axisLabel = $localize`kHz`;
  protected readonly write = kilohertz;
  protected readonly say = (hz: number): string => formatFrequency(hz);
  protected readonly frame = computed(() => {
    const [left, right] = this.width() < NARROW ? [40, 8] : [48, 16];
    return frame(this.width(), this.height(), { top: 34, right, bottom: 46, left });
  });
  protected readonly wholeScale = computed(() =>
    dialScale(this.range().low, this.range().high, this.frame().innerWidth, this.isLog()),
  );
  protected readonly shown = computed<Window>(
    () => this.window() ?? [this.range().low, this.range().high],
  );
  protected readonly scale = computed(() =>
    dialScale(...this.shown(), this.frame().innerWidth, this.isLog()),
  );
}
