import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { scaleLinear } from 'd3';

import { bandUnit } from '../readings';

interface Stretch {
  readonly low: number;
  readonly high: number;
}

/**
 * The band, its oscillator and its image as a list with a bar each on one scale: how far the image
 * keeps clear of the band. All it says stands in words and figures; there is nothing to read out.
 */
@Component({
  selector: 'app-range-bars',
  template: `
    <p>{{ sentence() }}</p>
    <dl>
      @for (bar of bars(); track bar.kind) {
        <div>
          <dt>{{ bar.label }}</dt>
          <dd class="bar" aria-hidden="true">
            @if (shared(); as both) {
              <span class="shared" [style.left.%]="both.left" [style.width.%]="both.width"></span>
            }
            <span [class]="bar.kind" [style.left.%]="bar.left" [style.width.%]="bar.width"></span>
          </dd>
          <dd class="figures">{{ bar.text }}</dd>
        </div>
      }
    </dl>
  `,
  styleUrl: './range-bars.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RangeBars {
  readonly band = input.required<Stretch>();
  readonly oscillator = input.required<Stretch>();
  readonly image = input.required<Stretch>();

  private readonly unit = computed(() => bandUnit(this.band().high));
  /** Share of the whole that a stretch begins at and takes, percent. */
  private readonly placed = computed(() => {
    const all = [this.band(), this.oscillator(), this.image()];
    const low = Math.min(...all.map((each) => each.low));
    const high = Math.max(...all.map((each) => each.high));
    const share = scaleLinear([low, high], [0, 100]);
    return (stretch: Stretch) => ({
      left: share(stretch.low),
      width: share(stretch.high) - share(stretch.low),
    });
  });
  protected readonly bars = computed(() =>
    [
      { kind: 'band', label: $localize`band`, stretch: this.band() },
      { kind: 'oscillator', label: $localize`oscillator`, stretch: this.oscillator() },
      { kind: 'image', label: $localize`image`, stretch: this.image() },
    ].map(({ kind, label, stretch }) => ({
      kind,
      label,
      ...this.placed()(stretch),
      text: $localize`${this.unit().write(stretch.low)}:low:\u2013${this.unit().write(stretch.high)}:high: ${this.unit().unit}:unit:`,
    })),
  );
  private readonly overlap = computed<Stretch | null>(() => {
    const low = Math.max(this.band().low, this.image().low);
    const high = Math.min(this.band().high, this.image().high);
    return high > low ? { low, high } : null;
  });
  protected readonly shared = computed(() => {
    const overlap = this.overlap();
    return overlap ? this.placed()(overlap) : null;
  });
  protected readonly sentence = computed(() => {
    const overlap = this.overlap();
    const { unit, write } = this.unit();
    const said = ({ low, high }: Stretch) =>
      $localize`${write(low)}:low: to ${write(high)}:high: ${unit}:unit:`;
    return overlap
      ? $localize`The image lies on ${said(this.image())}:image:; from ${said(overlap)}:overlap: it falls into the band itself.`
      : $localize`The image lies on ${said(this.image())}:image:, clear of the band itself.`;
  });
}
