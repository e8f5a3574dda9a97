import {
  ChangeDetectionStrategy,
  Component,
  computed,
  type ElementRef,
  input,
  model,
  output,
  signal,
  viewChild,
} from '@angular/core';

import { type Frame } from '../frame';
import { showing, type WholeScale, type Window, zoomed } from '../zoom-window';
import {
  inReadingOrder,
  markByKey,
  nearestAlong,
  nearestMark,
  type PlotMark,
  type Readout,
  spoken,
} from './plot-mark';
import { PlotReadout } from './plot-readout';
import { PlotZoom } from './plot-zoom';

const REACH = 28;
const ZOOM_STEP = 1.6;

/**
 * The surface every chart draws on: one tab stop, a readout by pointer and by key, zoom.
 * The chart projects its SVG elements, placed in the frame's inner area; what carries the attribute
 * `plotOverlay` is laid over the picture as HTML.
 */
@Component({
  selector: 'app-plot',
  templateUrl: './plot.html',
  styleUrl: './plot.scss',
  imports: [PlotReadout, PlotZoom],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    '(document:keydown.escape)': 'dismiss()',
    '(pointerleave)': 'leave()',
  },
})
export class Plot {
  readonly frame = input.required<Frame>();
  /** Name of the chart, for people who do not see it. */
  readonly label = input.required<string>();
  /** Marks in view. */
  readonly marks = input.required<readonly PlotMark[]>();
  /** What is said about a mark. */
  readonly describe = input.required<(id: string) => Readout | undefined>();
  /** Where a mark lies on the scale, to bring it into view; needed when the chart zooms. */
  readonly order = input<readonly { readonly id: string; readonly value: number }[]>([]);
  readonly wholeScale = input<WholeScale | null>(null);
  readonly window = model<Window | null>(null);
  /** Id of the mark picked, here or elsewhere on the page. */
  readonly picked = model<string | null>(null);
  /** The pointer asks for the mark above or below it, however far: for curves. */
  readonly readsAlong = input(false);
  /** What Enter does with a mark, as a sentence; empty: nothing. */
  readonly leadsOn = input('');
  /** Enter was pressed on a mark. */
  readonly entered = output<string>();

  private readonly surface = viewChild.required<ElementRef<HTMLElement>>('surface');

  protected readonly isFocused = signal(false);
  private readonly hovered = signal<string | null>(null);
  private readonly isDismissed = signal(false);

  private readonly ordered = computed(() => inReadingOrder(this.marks()));
  protected readonly activeMark = computed(() => {
    const wanted = this.hovered() ?? (this.isFocused() ? this.picked() : null);
    return this.marks().find(({ id }) => id === wanted);
  });
  protected readonly pickedMark = computed(() =>
    this.marks().find(({ id }) => id === this.picked()),
  );
  protected readonly readout = computed(() => {
    const mark = this.activeMark();
    return mark && !this.isDismissed() ? this.describe()(mark.id) : undefined;
  });
  protected readonly announcement = computed(() => {
    const id = this.picked();
    const readout = this.isFocused() && id !== null ? this.describe()(id) : undefined;
    return readout ? spoken(readout) : '';
  });
  protected readonly manual = computed(() =>
    [
      $localize`Arrow keys go from mark to mark, Home and End to the first and last.`,
      this.leadsOn(),
      this.wholeScale() ? $localize`Plus and minus zoom, 0 shows the whole range.` : '',
    ].join(' '),
  );

  protected hover(event: PointerEvent): void {
    if (event.buttons > 0 && event.pointerType === 'mouse') return;
    const found = this.markAt(event);
    if (found?.id !== this.hovered()) this.isDismissed.set(false);
    this.hovered.set(found?.id ?? null);
  }

  protected pick(event: MouseEvent): void {
    const found = this.markAt(event);
    this.isDismissed.set(false);
    if (found) this.picked.set(found.id);
  }

  protected leave(): void {
    this.hovered.set(null);
  }

  protected dismiss(): void {
    this.isDismissed.set(true);
  }

  protected press(event: KeyboardEvent): void {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (this.move(event.key) || this.zoom(event.key) || this.enter(event.key)) {
      event.preventDefault();
    }
  }

  private markAt(event: MouseEvent): PlotMark | undefined {
    const box = this.surface().nativeElement.getBoundingClientRect();
    const { margin } = this.frame();
    const [x, y] = [event.clientX - box.left - margin.left, event.clientY - box.top - margin.top];
    return this.readsAlong()
      ? nearestAlong(this.marks(), x, REACH)
      : nearestMark(this.marks(), x, y, REACH);
  }

  /** Goes to the next mark, also to one that is out of view. */
  private move(key: string): boolean {
    const scale = this.wholeScale();
    const all = this.order();
    const reachable =
      scale && all.length > 0
        ? inReadingOrder(all.map(({ id, value }) => ({ id, x: scale(value), y: 0 })))
        : this.ordered();
    const next = markByKey(reachable, this.picked(), key);
    if (!next) return false;
    this.hovered.set(null);
    this.isDismissed.set(false);
    this.picked.set(next.id);
    const value = all.find(({ id }) => id === next.id)?.value;
    const window = this.window();
    if (scale && window && value !== undefined) this.window.set(showing(scale, window, value));
    return true;
  }

  private zoom(key: string): boolean {
    const scale = this.wholeScale();
    if (!scale || !['+', '=', '-', '0'].includes(key)) return false;
    const [low = 0, high = 1] = scale.domain();
    if (key === '0') this.window.set(null);
    else
      this.window.set(
        zoomed(scale, this.window() ?? [low, high], key === '-' ? 1 / ZOOM_STEP : ZOOM_STEP),
      );
    return true;
  }

  private enter(key: string): boolean {
    const id = this.picked();
    if (key !== 'Enter' || id === null || this.leadsOn() === '') return false;
    this.entered.emit(id);
    return true;
  }
}
