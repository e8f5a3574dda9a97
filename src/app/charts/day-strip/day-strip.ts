import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { scaleLinear } from 'd3';

import { type Curve } from '../curves/curve';
import { CurveChart, type Rule } from '../curves/curve-chart';
import { frame, NARROW } from '../frame';
import { observeWidth } from '../observe-width';
import { type Window } from '../zoom-window';
import { clock, TimeAxis } from './time-axis';

const DAY = 24 * 60;

/**
 * The 24 hours of a day at a site, level up, the night shaded: when something rises and falls.
 *
 *     <app-day-strip
 *       heading="Through the day"
 *       description="Loudest at 23:40: 31.2 dB over the noise."
 *       levelLabel="breakthrough over the noise, dB"
 *       timeLabel="local solar time"
 *       [nights]="[[0, 372], [1105, 1440]]"
 *       [curves]="[{ id: 'breakthrough', name: 'IF breakthrough',
 *                    points: [{ at: 0, level: 30.1 }, { at: 30, level: 29.8 }, …] }]"
 *       [rules]="[{ at: 720, text: 'noon' }]"
 *       [(picked)]="picked"
 *     />
 *
 * Times are minutes since midnight, 0 to 1440. `picked` is the time read out, as text: `'30'`.
 */
@Component({
  selector: 'app-day-strip',
  template: `
    <app-curve-chart
      [heading]="heading()"
      [description]="description()"
      [curves]="curves()"
      [frame]="frame()"
      [wholeScale]="scale()"
      [scale]="scale()"
      [alongLabel]="timeLabel()"
      [writeAlong]="write"
      [sayAlong]="write"
      [levelLabel]="levelLabel()"
      [levelUnit]="levelUnit()"
      [rules]="rules()"
      [shaded]="nights()"
      [(picked)]="picked"
    >
      <svg:g appTimeAxis [scale]="scale()" [length]="frame().innerWidth" [label]="timeLabel()" />
    </app-curve-chart>
  `,
  styles: `
    :host {
      display: block;
    }
  `,
  imports: [CurveChart, TimeAxis],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DayStrip {
  readonly heading = input.required<string>();
  /** A sentence with the chart's own numbers. */
  readonly description = input.required<string>();
  readonly curves = input.required<readonly Curve[]>();
  /** From dusk to dawn, minutes since midnight; a night over midnight is given in two. */
  readonly nights = input<readonly Window[]>([]);
  readonly levelLabel = input.required<string>();
  readonly levelUnit = input('dB');
  /** Which clock this is. */
  readonly timeLabel = input($localize`Time, UTC`);
  readonly height = input(220);
  readonly rules = input<readonly Rule[]>([]);
  readonly picked = model<string | null>(null);

  private readonly width = observeWidth();
  protected readonly write = clock;
  protected readonly frame = computed(() => {
    const [left, right] = this.width() < NARROW ? [40, 16] : [48, 20];
    return frame(this.width(), this.height(), { top: 34, right, bottom: 46, left });
  });
  protected readonly scale = computed(() => scaleLinear([0, DAY], [0, this.frame().innerWidth]));
}
