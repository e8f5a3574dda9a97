import { DestroyRef, ElementRef, inject, signal, type Signal } from '@angular/core';

/** Width of the component's own element in CSS pixels, kept current. Call while it is made. */
export function observeWidth(): Signal<number> {
  const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
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
  return width.asReadonly();
}
