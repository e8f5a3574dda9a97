import { computed, inject, Injectable, linkedSignal } from '@angular/core';
import { takeUntilDestroyed, toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import { debounceTime } from 'rxjs';

import type { Window } from '../../charts/zoom-window';
import { readZoom, withinBand, zoomText } from './zoom-windows';

/** A wheel goes through many windows: the address follows when it rests, one step of "back" each. */
const RESTS_MS = 400;

/** What of each band its charts show. It stands in the address, and is the same on every section. */
@Injectable()
export class ZoomStore {
  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });
  private readonly addressed = computed(() => this.query().get('zoom'));
  private readonly windows = linkedSignal(() => readZoom(this.addressed()));

  constructor() {
    toObservable(this.windows)
      .pipe(debounceTime(RESTS_MS), takeUntilDestroyed())
      .subscribe((windows) => {
        const zoom = zoomText(windows);
        if (zoom !== zoomText(readZoom(this.addressed()))) void this.write(zoom);
      });
  }

  /** The window of a band; null: the whole of it. */
  of(at: number, band: { readonly lowHz: number; readonly highHz: number }): Window | null {
    return withinBand(this.windows().get(at), band);
  }

  show(at: number, window: Window | null): void {
    this.windows.update((before) => {
      const others = [...before].filter(([each]) => each !== at);
      return new Map(window ? [...others, [at, window]] : others);
    });
  }

  private async write(zoom: string | null): Promise<void> {
    await this.router.navigate([], {
      relativeTo: this.route,
      queryParams: { zoom },
      queryParamsHandling: 'merge',
      scroll: 'manual',
    });
  }
}
