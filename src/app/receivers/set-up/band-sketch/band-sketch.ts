import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { observeWidth } from '../../../charts/observe-width';
import { formatFrequency } from '../../../ui/frequency-pipe';
import type { ReceiverFields } from '../receiver-form/controls';
import { sketchMarks, type SketchRow, sketchRows, sketchScale } from './sketch-layout';

const ROW_HEIGHT = 44;
const TOP = 28;
const FOOT = 30;
const NUMERAL_GAP = 48;

/** The bands, their images and the IF on one scale, drawn while the set is being typed. */
@Component({
  selector: 'app-band-sketch',
  templateUrl: './band-sketch.html',
  styleUrl: './band-sketch.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BandSketch {
  readonly fields = input.required<ReceiverFields>();

  protected readonly top = TOP;
  protected readonly width = observeWidth();
  protected readonly rows = computed(() => sketchRows(this.fields()));
  protected readonly height = computed(() => TOP + this.rows().length * ROW_HEIGHT + FOOT);
  protected readonly foot = computed(() => this.height() - FOOT);

  private readonly scale = computed(() =>
    sketchScale(this.rows(), this.fields().ifHz, this.width()),
  );

  protected readonly bars = computed(() => this.rows().map((row, at) => this.bar(row, at)));
  protected readonly marks = computed(() => sketchMarks(this.scale(), NUMERAL_GAP));
  protected readonly ifMark = computed(() => {
    const { ifHz } = this.fields();
    if (ifHz === null || this.rows().length === 0) return null;
    const at = this.scale()(ifHz);
    return {
      at,
      text: `IF ${formatFrequency(ifHz)}`,
      anchor: at > this.width() / 2 ? 'end' : 'start',
    };
  });
  protected readonly description = computed(() =>
    this.rows()
      .map(
        ({ name, band, image }) =>
          $localize`${name}:name: from ${formatFrequency(band[0])}:low: to ${formatFrequency(band[1])}:high:, images from ${formatFrequency(image[0])}:imageLow: to ${formatFrequency(image[1])}:imageHigh:`,
      )
      .join('; '),
  );

  private bar({ name, band, image }: SketchRow, at: number) {
    const scale = this.scale();
    const span = ([from, to]: readonly [number, number]) => ({
      x: scale(Math.max(from, 1)),
      width: Math.max(2, scale(to) - scale(Math.max(from, 1))),
    });
    const nameAnchor = scale(band[0]) > this.width() * 0.7 ? 'end' : 'start';
    const nameAt = nameAnchor === 'end' ? scale(band[1]) : scale(band[0]);
    return {
      name,
      nameAnchor,
      nameAt,
      y: TOP + at * ROW_HEIGHT,
      band: span(band),
      image: span(image),
    };
  }
}
