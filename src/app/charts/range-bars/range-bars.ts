import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { scaleLinear } from 'd3';

import { observeWidth } from '../observe-width';
import { bandUnit } from '../readings';

interface Stretch {
  readonly low: number;
  readonly high: number;
}

const ROW = 18;
const LABEL = 84;
const FIGURES = 92;

/** The band, its oscillator and its image on one scale: how far the image keeps clear of the band. */
@Component({
  selector: 'app-range-bars',
  template: `
    <svg role="img" [attr.aria-label]="sentence()" [attr.width]="width()" [attr.height]="height">
      @for (bar of bars(); track bar.label) {
        <text class="label" dy="0.32em" [attr.y]="bar.y">{{ bar.label }}</text>
        <line
          [class]="bar.kind"
          [attr.x1]="bar.from"
          [attr.x2]="bar.to"
          [attr.y1]="bar.y"
          [attr.y2]="bar.y"
        />
        <text class="figures" dy="0.32em" [attr.x]="width()" [attr.y]="bar.y">{{ bar.text }}</text>
      }
      @if (shared(); as both) {
        <rect
          class="shared"
          [attr.x]="both.from"
          [attr.width]="both.width"
          [attr.height]="height"
        />
      }
    </svg>
  `,
  styleUrl: './range-bars.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RangeBars {
  readonly band = input.required<Stretch>();
  readonly oscillator = input.required<Stretch>();
  readonly image = input.required<Stretch>();

  protected readonly width = observeWidth();
  protected readonly height = 3 * ROW;
  private readonly unit = computed(() => bandUnit(this.band().high));
  private readonly x = computed(() => {
    const all = [this.band(), this.oscillator(), this.image()];
    const low = Math.min(...all.map((each) => each.low));
    const high = Math.max(...all.map((each) => each.high));
    return scaleLinear([low, high], [LABEL, Math.max(LABEL + 40, this.width() - FIGURES)]);
  });
  protected readonly bars = computed(() =>
    [
      { kind: 'band', label: $localize`band`, stretch: this.band() },
      { kind: 'oscillator', label: $localize`oscillator`, stretch: this.oscillator() },
      { kind: 'image', label: $localize`image`, stretch: this.image() },
    ].map(({ kind, label, stretch }, at) => ({
      kind,
      label,
      y: ROW * (at + 0.5),
      from: this.x()(stretch.low),
      to: this.x()(stretch.high),
      text: `${this.unit().write(stretch.low)}–${this.unit().write(stretch.high)}`,
    })),
  );
  private readonly overlap = computed<Stretch | null>(() => {
    const low = Math.max(this.band().low, this.image().low);
    const high = Math.min(this.band().high, this.image().high);
    return high > low ? { low, high } : null;
  });
  protected readonly shared = computed(() => {
    const overlap = this.overlap();
    if (!overlap) return null;
    const from = this.x()(overlap.low);
    return { from, width: this.x()(overlap.high) - from };
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
