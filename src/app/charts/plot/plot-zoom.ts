import { DestroyRef, Directive, effect, ElementRef, inject, input, model } from '@angular/core';
import { select, zoom, zoomIdentity, type ZoomTransform } from 'd3';

import { type Frame } from '../frame';
import { MOST_ZOOM, type WholeScale, type Window } from '../zoom-window';

/**
 * Zooms by pinch or Ctrl and wheel, and pans by dragging with a mouse or two fingers. A plain wheel
 * and a single finger stay with the page, so that it still scrolls over a chart.
 */
@Directive({ selector: '[appPlotZoom]' })
export class PlotZoom {
  private readonly area = inject<ElementRef<SVGGElement>>(ElementRef).nativeElement;

  /** Scale over the whole range; null: the chart does not zoom. */
  readonly appPlotZoom = input.required<WholeScale | null>();
  readonly frame = input.required<Frame>();
  readonly window = model.required<Window | null>();

  private readonly behaviour = zoom<SVGGElement, unknown>()
    .scaleExtent([1, MOST_ZOOM])
    .filter((event: Event) => this.isMeant(event))
    .on('zoom', (event: { transform: ZoomTransform; sourceEvent: unknown }) => {
      if (event.sourceEvent) this.follow(event.transform);
    });

  constructor() {
    const area = select<SVGGElement, unknown>(this.area);
    area.call(this.behaviour).on('dblclick.zoom', null);
    effect(() => {
      const { innerWidth, innerHeight } = this.frame();
      const extent: [[number, number], [number, number]] = [
        [0, 0],
        [innerWidth, innerHeight],
      ];
      this.behaviour.extent(extent).translateExtent(extent);
      area.property('__zoom', this.transform());
    });
    inject(DestroyRef).onDestroy(() => area.on('.zoom', null));
  }

  private isMeant(event: Event): boolean {
    if (this.appPlotZoom() === null) return false;
    if (event instanceof WheelEvent) return event.ctrlKey || event.metaKey;
    if (event instanceof MouseEvent) return event.button === 0 && this.window() !== null;
    return 'touches' in event && (event as TouchEvent).touches.length > 1;
  }

  private transform(): ZoomTransform {
    const scale = this.appPlotZoom();
    const window = this.window();
    if (!scale || !window) return zoomIdentity;
    const [left = 0, right = 1] = scale.range();
    const [from, to] = [scale(window[0]), scale(window[1])];
    return zoomIdentity.scale((right - left) / (to - from)).translate(-from, 0);
  }

  private follow(transform: ZoomTransform): void {
    const scale = this.appPlotZoom();
    if (!scale) return;
    const [left = 0, right = 1] = scale.range();
    const ends = [left, right].map((pixel) => scale.invert(transform.invertX(pixel)));
    this.window.set(transform.k === 1 ? null : [ends[0] ?? 0, ends[1] ?? 1]);
  }
}
