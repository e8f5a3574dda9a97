import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { bandUnit } from '../readings';
import { numerals, type Position, scaleMarks } from '../scale-marks';
import { type Window } from '../zoom-window';
import { STRIP } from './strip-layout';

const NUMERAL_SIZE = 13;
const TICK_GAP = 5;

/** The glass of the dial with its scale: ticks and numerals as fine as there is room. */
@Component({
  selector: 'svg:g[appDialGlass]',
  template: `
    <svg:rect rx="3" [attr.width]="length()" [attr.height]="height" />
    @for (tick of ticks(); track tick.hz) {
      <svg:line class="tick" y2="7" [attr.x1]="tick.at" [attr.x2]="tick.at" />
    }
    @for (mark of numerals(); track mark.hz) {
      <svg:line class="major" y2="14" [attr.x1]="mark.at" [attr.x2]="mark.at" />
      <svg:text class="numeral" y="31" [attr.x]="mark.at">{{ mark.text }}</svg:text>
    }
    <svg:text class="unit" x="-6" y="19">{{ unit().unit }}</svg:text>
  `,
  styleUrl: './dial-glass.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DialGlass {
  readonly scale = input.required<Position>();
  readonly window = input.required<Window>();
  /** High end of the whole band, hertz: it sets the unit. */
  readonly highHz = input.required<number>();
  readonly length = input.required<number>();

  protected readonly height = STRIP.glass;
  protected readonly unit = computed(() => bandUnit(this.highHz()));
  protected readonly numerals = computed(() =>
    numerals(this.scale(), ...this.window(), this.unit().write, NUMERAL_SIZE),
  );
  protected readonly ticks = computed(() => scaleMarks(this.scale(), ...this.window(), TICK_GAP));
}
