import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatChipsModule } from '@angular/material/chips';
import { ActivatedRoute, Router } from '@angular/router';

import type { RejectionChange } from '../../../../shared/radio/rejection/rejection-alternatives';
import { LineChart } from '../../charts/line-chart/line-chart';
import { ZoomStore } from '../address/zoom-store';
import { TrialStore } from '../trial/trial-store';
import { TrialInput } from '../trial-input/trial-input';
import { REJECTION_CHANGES, rejectionCharts } from './rejection-curves';

/** Section of a receiver: how far image and IF are rejected along each band, and what would help. */
@Component({
  selector: 'app-rejection-page',
  templateUrl: './rejection-page.html',
  styleUrl: './rejection-page.scss',
  imports: [LineChart, MatChipsModule, TrialInput],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RejectionPage {
  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);
  protected readonly store = inject(TrialStore);
  protected readonly zoom = inject(ZoomStore);
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });

  protected readonly changes = REJECTION_CHANGES;
  /** Dial setting read out, in all charts at once. */
  protected readonly picked = signal<string | null>(null);
  protected readonly chosen = computed<RejectionChange[]>(() => {
    const said = this.query().get('with')?.split(',') ?? [];
    return this.changes.map(({ change }) => change).filter((each) => said.includes(each));
  });
  protected readonly charts = computed(() => {
    const receiver = this.store.setup()?.receiver;
    return receiver
      ? rejectionCharts({ ...receiver, ifHz: this.store.trialHz() }, this.chosen())
      : [];
  });

  protected readonly windows = computed(() =>
    this.charts().map(({ at, range }) =>
      this.zoom.of(at, { lowHz: range.low, highHz: range.high }),
    ),
  );

  protected choose(changes: readonly RejectionChange[]): void {
    void this.router.navigate([], {
      relativeTo: this.route,
      queryParams: { with: changes.join(',') || null },
      queryParamsHandling: 'merge',
      scroll: 'manual',
    });
  }
}
