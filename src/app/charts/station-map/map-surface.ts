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
import { markByKey, nearestMark, type PlotMark, type Readout, spoken } from '../plot/plot-mark';
import { PlotReadout } from '../plot/plot-readout';
import { inPicture, type MapView, type PlanePoint, showingPoint } from './map-plane';
import { MapZoom } from './map-zoom';
import { closer, moved, moves } from './map-moves';

const REACH = 20;

/** The surface a map is drawn on: one tab stop, a readout by pointer and by key, zoom and pan. */
@Component({
  selector: 'app-map-surface',
  templateUrl: './map-surface.html',
  styleUrl: './map-surface.scss',
  imports: [MapZoom, PlotReadout],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(document:keydown.escape)': 'isDismissed.set(true)', '(pointerleave)': 'leave()' },
})
export class MapSurface {
  readonly frame = input.required<Frame>();
  readonly label = input.required<string>();
  /** Marks in view. */
  readonly marks = input.required<readonly PlotMark[]>();
  /** All stations in the order in which keys go through them, also those out of view. */
  readonly order = input.required<readonly PlotMark[]>();
  /** Where a station lies on the plane. */
  readonly placeOf = input.required<(id: string) => PlanePoint | undefined>();
  readonly describe = input.required<(id: string) => Readout | undefined>();
  readonly whole = input.required<MapView>();
  readonly view = model.required<MapView>();
  readonly picked = model<string | null>(null);
  /** What Enter does with a station, as a sentence. */
  readonly leadsOn = input('');
  readonly entered = output<string>();

  private readonly surface = viewChild.required<ElementRef<HTMLElement>>('surface');

  protected readonly isFocused = signal(false);
  protected readonly isDismissed = signal(false);
  private readonly hovered = signal<string | null>(null);

  protected readonly activeMark = computed(() =>
    this.markOf(this.hovered() ?? (this.isFocused() ? this.picked() : null)),
  );
  protected readonly pickedMark = computed(() => this.markOf(this.picked()));
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
      $localize`Arrow keys go from station to station, the strongest first; Home and End to the first and last.`,
      this.leadsOn(),
      $localize`Plus and minus zoom, Shift with arrow keys moves the map, 0 shows all stations.`,
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

  protected press(event: KeyboardEvent): void {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (this.move(event) || this.zoom(event.key) || this.go(event.key) || this.enter(event.key)) {
      event.preventDefault();
    }
  }

  private markOf(id: string | null): PlotMark | undefined {
    const point = id === null ? undefined : this.placeOf()(id);
    if (id === null || !point) return undefined;
    const { x, y } = inPicture(point, this.view(), this.frame());
    const { width, height } = this.frame();
    return x < 0 || y < 0 || x > width || y > height ? undefined : { id, x, y };
  }

  private markAt(event: MouseEvent): PlotMark | undefined {
    const box = this.surface().nativeElement.getBoundingClientRect();
    return nearestMark(this.marks(), event.clientX - box.left, event.clientY - box.top, REACH);
  }

  private move({ key, shiftKey }: KeyboardEvent): boolean {
    const step = moves[key];
    if (!shiftKey || !step) return false;
    this.view.set(moved(this.view(), step, this.frame()));
    return true;
  }

  private zoom(key: string): boolean {
    if (!['+', '=', '-', '0'].includes(key)) return false;
    this.view.set(
      key === '0' ? this.whole() : closer(this.view(), key === '-' ? -1 : 1, this.frame()),
    );
    return true;
  }

  /** Goes to the next station, also to one that is out of view. */
  private go(key: string): boolean {
    const next = markByKey(this.order(), this.picked(), key);
    if (!next) return false;
    this.hovered.set(null);
    this.isDismissed.set(false);
    this.picked.set(next.id);
    const point = this.placeOf()(next.id);
    if (point) this.view.set(showingPoint(this.view(), point, this.frame()));
    return true;
  }

  private enter(key: string): boolean {
    const id = this.picked();
    if (key !== 'Enter' || id === null) return false;
    this.entered.emit(id);
    return true;
  }
}
