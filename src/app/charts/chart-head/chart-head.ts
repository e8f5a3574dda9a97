import { ChangeDetectionStrategy, Component, computed, input, model } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { Icon } from '../../ui/icon/icon';
import { parseQuantity } from '../../ui/quantity/quantity';
import { kilohertz } from '../readings';
import { type WholeScale, type Window, windowBetween, zoomed } from '../zoom-window';

const ZOOM_STEP = 1.6;

/** What stands over a chart: its name, what it says in a sentence, zoom, and the way to its table. */
@Component({
  selector: 'app-chart-head',
  templateUrl: './chart-head.html',
  styleUrl: './chart-head.scss',
  imports: [Icon, MatButtonModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChartHead {
  readonly heading = input.required<string>();
  readonly description = input.required<string>();
  /** Said instead of the description, in its room, while what is drawn is being replaced. */
  readonly awaited = input<string | null>(null);
  /** Frequency scale over the whole range; null: the chart does not zoom. */
  readonly wholeScale = input<WholeScale | null>(null);
  readonly window = model<Window | null>(null);
  readonly isTable = model(false);

  protected readonly ends = computed(() => {
    const [low = 0, high = 0] = this.window() ?? this.wholeScale()?.domain() ?? [];
    return { low: kilohertz(Math.round(low)), high: kilohertz(Math.round(high)) };
  });

  protected zoom(factor: number): void {
    const scale = this.wholeScale();
    if (!scale) return;
    const [low = 0, high = 1] = scale.domain();
    this.window.set(zoomed(scale, this.window() ?? [low, high], factor));
  }

  protected readonly closer = (): void => {
    this.zoom(ZOOM_STEP);
  };

  protected readonly wider = (): void => {
    this.zoom(1 / ZOOM_STEP);
  };

  /** Takes limits as typed; what cannot be read goes back to what was shown. */
  protected limit(low: HTMLInputElement, high: HTMLInputElement): void {
    const scale = this.wholeScale();
    const ends = [low, high].map(({ value }) => parseQuantity(value, 'frequency'));
    const [from, to] = ends.map((end) => ('value' in end ? end.value : null));
    if (scale && from != null && to != null && from !== to) {
      this.window.set(windowBetween(scale, from, to));
    }
    low.value = this.ends().low;
    high.value = this.ends().high;
  }
}
