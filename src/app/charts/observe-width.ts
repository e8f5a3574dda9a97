import { computed, DestroyRef, ElementRef, inject, signal, type Signal } from '@angular/core';

import { PAPER_WIDTH, Printing } from './chart/printing';

/**
 * Width of the component's own element in CSS pixels, kept current; on paper, the paper's. Call
 * while it is made.
 */
export function observeWidth(): Signal<number> {
  const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  const printing = inject(Printing);
  const width = signal(host.clientWidth || 640);
  if (typeof ResizeObserver !== 'undefined') {
    const observer = new ResizeObserver(([entry]) => {
      if (entry && entry.contentRect.width > 0) width.set(Math.round(entry.contentRect.width));
    });
    observer.observe(host);
    inject(DestroyRef).onDestroy(() => {
      observer.disconnect();
    });
  }
  return computed(() => (printing.isOn() ? PAPER_WIDTH : width()));
}
