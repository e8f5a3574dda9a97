import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { kilohertz } from '../readings';
import { numerals, type Position, scaleMarks } from '../scale-marks';
import { type Window } from '../zoom-window';

const TICK_GAP = 6;

/** A frequency axis along the foot of a chart: fine ticks, numerals where they fit, its unit. */
@Component({
  selector: 'svg:g[appFrequencyAxis]',
  template: `
    <svg:line class="base" [attr.x2]="length()" />
    @for (tick of ticks(); track tick.hz) {
      <svg:line class="tick" y2="4" [attr.x1]="tick.at" [attr.x2]="tick.at" />
    }
    @for (mark of numerals(); track mark.hz) {
      <svg:line class="major" y2="8" [attr.x1]="mark.at" [attr.x2]="mark.at" />
      <svg:text y="22" [attr.x]="mark.at">{{ mark.text }}</svg:text>
    }
    <svg:text class="unit" y="38" [attr.x]="length()">{{ label() }}</svg:text>
  `,
  styleUrl: './axis.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FrequencyAxis {
  readonly scale = input.required<Position>();
  readonly window = input.required<Window>();
  readonly length = input.required<number>();
  readonly label = input.required<string>();

  protected readonly numerals = computed(() => numerals(this.scale(), ...this.window(), kilohertz));
  protected readonly ticks = computed(() => scaleMarks(this.scale(), ...this.window(), TICK_GAP));
}
