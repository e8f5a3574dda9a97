import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { type Frame } from '../frame';
import { type PlotMark, type Readout } from './plot-mark';

const WIDTH = 248;
const GAP = 12;

/** Exact values at a mark, beside it and inside the picture. */
@Component({
  selector: 'app-plot-readout',
  template: `
    <p class="title">{{ readout().title }}</p>
    <dl>
      @for (line of readout().lines; track line.label) {
        <dt>{{ line.label }}</dt>
        <dd>{{ line.value }}</dd>
      }
    </dl>
    @if (hint()) {
      <p class="hint">{{ hint() }}</p>
    }
  `,
  styleUrl: './plot-readout.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    '[style.left.px]': 'left()',
    '[style.top.px]': 'top()',
    '[style.bottom.px]': 'bottom()',
    '[style.width.px]': 'width()',
  },
})
export class PlotReadout {
  readonly readout = input.required<Readout>();
  readonly mark = input.required<PlotMark>();
  readonly frame = input.required<Frame>();
  readonly hint = input('');

  protected readonly width = computed(() => Math.min(WIDTH, this.frame().width - 2 * GAP));
  protected readonly left = computed(() => {
    const { width, margin } = this.frame();
    const at = this.mark().x + margin.left;
    const isLeftHalf = at < width / 2;
    const wanted = isLeftHalf ? at + GAP : at - GAP - this.width();
    return Math.max(0, Math.min(wanted, width - this.width()));
  });
  private readonly isUpperHalf = computed(() => this.mark().y < this.frame().innerHeight / 2);
  protected readonly top = computed(() =>
    this.isUpperHalf() ? this.mark().y + this.frame().margin.top + GAP : null,
  );
  protected readonly bottom = computed(() =>
    this.isUpperHalf() ? null : this.frame().height - this.mark().y - this.frame().margin.top + GAP,
  );
}
