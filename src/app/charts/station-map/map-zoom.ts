import { DestroyRef, Directive, effect, ElementRef, inject, input, model } from '@angular/core';
import { select, zoom, zoomIdentity, type ZoomTransform } from 'd3';

import { type Frame } from '../frame';
import { fittedView, type MapView, mostAcross } from './map-plane';

const CLOSEST_KM = 20;

/**
 * Moves a map by dragging with a mouse or two fingers, and zooms by pinch or Ctrl and wheel. A plain
 * wheel and a single finger stay with the page, so that it still scrolls over the map.
 */
@Directive({ selector: '[appMapZoom]' })
export class MapZoom {
  private readonly area = inject<ElementRef<SVGGElement>>(ElementRef).nativeElement;

  /** The view on everything. */
  readonly appMapZoom = input.required<MapView>();
  readonly frame = input.required<Frame>();
  readonly view = model.required<MapView>();

  private readonly behaviour = zoom<SVGGElement, unknown>()
    .filter((event: Event) => isMeant(event))
    .on('zoom', (event: { transform: ZoomTransform; sourceEvent: unknown }) => {
      if (event.sourceEvent) this.follow(event.transform);
    });

  constructor() {
    const area = select<SVGGElement, unknown>(this.area);
    area.call(this.behaviour).on('dblclick.zoom', null);
    effect(() => {
      const { width, height } = this.frame();
      const whole = this.appMapZoom().acrossKm;
      this.behaviour
        .extent([
          [0, 0],
          [width, height],
        ])
        .scaleExtent([whole / mostAcross(this.frame()), whole / CLOSEST_KM]);
      area.property('__zoom', this.transform());
    });
    inject(DestroyRef).onDestroy(() => area.on('.zoom', null));
  }

  private transform(): ZoomTransform {
    const { width, height } = this.frame();
    const { x, y, acrossKm } = this.view();
    const scale = width / acrossKm;
    const whole = this.appMapZoom();
    const times = whole.acrossKm / acrossKm;
    return zoomIdentity
      .translate(
        (width / 2) * (1 - times) + (whole.x - x) * scale,
        (height / 2) * (1 - times) + (whole.y - y) * scale,
      )
      .scale(times);
  }

  private follow({ k: times, x, y }: ZoomTransform): void {
    const { width, height } = this.frame();
    const whole = this.appMapZoom();
    const acrossKm = whole.acrossKm / times;
    const scale = width / acrossKm;
    const moved = {
      x: whole.x + ((width / 2) * (1 - times) - x) / scale,
      y: whole.y + ((height / 2) * (1 - times) - y) / scale,
      acrossKm,
    };
    this.view.set(fittedView(moved, this.frame()));
  }
}

function isMeant(event: Event): boolean {
  if (event instanceof WheelEvent) return event.ctrlKey || event.metaKey;
  if (event instanceof MouseEvent) return event.button === 0;
  return 'touches' in event && (event as TouchEvent).touches.length > 1;
}
