import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type ScaleLinear } from 'd3';

import { whole } from '../readings';

/** A level axis on the left, with hairlines across the chart. */
@Component({
  selector: 'svg:g[appLevelAxis]',
  template: `
    @for (tick of ticks(); track tick.value) {
      <svg:line class="grid" [attr.x2]="length()" [attr.y1]="tick.at" [attr.y2]="tick.at" />
      <svg:text class="level" x="-8" dy="0.32em" [attr.y]="tick.at">{{ tick.text }}</svg:text>
    }
    <svg:text class="quantity" x="-40" [attr.y]="top() - 14">{{ label() }}</svg:text>
  `,
  styleUrl: './axis.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LevelAxis {
  readonly scale = input.required<ScaleLinear<number, number>>();
  readonly length = input.required<number>();
  readonly label = input.required<string>();

  protected readonly top = computed(() => Math.min(...this.scale().range()));
  protected readonly ticks = computed(() => {
    const scale = this.scale();
    const [start = 0, end = 0] = scale.range();
    const count = Math.max(2, Math.abs(end - start) / 56);
    return scale.ticks(count).map((value) => ({ value, at: scale(value), text: whole(value) }));
  });
}
