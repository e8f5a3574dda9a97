import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import type { Problem } from '../../../../shared/contracts/problem';
import type { Region } from '../../../../shared/contracts/region';
import { rasterChannels } from '../../../../shared/radio/channels/raster';
import { toProblem } from '../../core/api-problem';
import { Confirm } from '../../ui/confirm/confirm';
import { Icon } from '../../ui/icon/icon';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { RasterPipe } from '../raster-pipe';
import { RegionStore } from '../region-store';
import { CorrectionList } from './correction-list';
import { EditionList } from './edition-list';

/** A region: its raster and the editions of its list. */
@Component({
  selector: 'app-region-page',
  imports: [
    CorrectionList,
    DatePipe,
    EditionList,
    Icon,
    Loading,
    MatButtonModule,
    ProblemNote,
    RasterPipe,
    RouterLink,
  ],
  templateUrl: './region-page.html',
  styleUrl: './region-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RegionPage {
  private readonly store = inject(RegionStore);
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);

  readonly id = input.required<string>();

  protected readonly region = this.store.one(this.id);
  protected readonly channels = computed(
    () => rasterChannels(this.region.value()?.raster ?? [], 0, Number.MAX_SAFE_INTEGER).length,
  );
  /** Why the region could not be deleted. */
  protected readonly refusal = signal<Problem | null>(null);

  protected async remove({ id, name, editions }: Region): Promise<void> {
    const agreed = await this.confirm.ask({
      title: $localize`Delete ${name}:region:?`,
      text:
        editions === 0
          ? $localize`The region has no list yet.`
          : $localize`All its editions go with it. Plans judged against them stay as they are.`,
      agree: $localize`Delete the region`,
      decline: $localize`Keep it`,
    });
    if (!agreed) return;
    try {
      await this.store.remove(`${id}`);
      await this.router.navigate(['/regions']);
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
