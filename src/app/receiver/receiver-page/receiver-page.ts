import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  signal,
  ViewContainerRef,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { RouterLink, RouterOutlet } from '@angular/router';
import { firstValueFrom } from 'rxjs';

import type { Plan } from '../../../../shared/contracts/plan';
import { ChartOrigin } from '../../charts/chart/chart-origin';
import { kilohertz } from '../../charts/readings';
import { FrequencyPipe } from '../../ui/frequency-pipe';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { ZoomStore } from '../address/zoom-store';
import { KeepPlan, type PlanToKeep } from '../keep-plan/keep-plan';
import { Pickers } from '../pickers/pickers';
import { SectionNav } from '../section-nav/section-nav';
import { SetUpTrial } from '../set-up-trial/set-up-trial';
import { TrialBar } from '../set-up-trial/trial-bar';
import { SiteInvitation } from '../site-invitation/site-invitation';
import { TrialProgress } from '../trial-progress/trial-progress';
import { TrialInputs } from '../trial/trial-inputs';
import { TrialStore } from '../trial/trial-store';
import { ReceiverOrigin } from './receiver-origin';
import { ReceiverStore } from './receiver-store';

/** The frame around the sections of one receiver: where it stands, and what is on trial. */
@Component({
  selector: 'app-receiver-page',
  templateUrl: './receiver-page.html',
  styleUrl: './receiver-page.scss',
  imports: [
    FrequencyPipe,
    Loading,
    MatButtonModule,
    Pickers,
    ProblemNote,
    RouterLink,
    RouterOutlet,
    SectionNav,
    SiteInvitation,
    TrialBar,
    TrialProgress,
  ],
  providers: [
    ReceiverStore,
    { provide: TrialInputs, useExisting: ReceiverStore },
    { provide: ChartOrigin, useClass: ReceiverOrigin },
    TrialStore,
    SetUpTrial,
    ZoomStore,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReceiverPage {
  private readonly dialog = inject(MatDialog);
  private readonly viewContainerRef = inject(ViewContainerRef);
  protected readonly store = inject(ReceiverStore);

  protected readonly kept = signal<Plan | undefined>(undefined);
  private readonly remotes = [
    this.store.receiver,
    this.store.sites,
    this.store.editions,
    this.store.regions,
  ];
  protected readonly problem = computed(() =>
    this.remotes.map(({ problem }) => problem()).find((each) => each !== undefined),
  );
  protected readonly hasNoSite = computed(() => this.store.sites.value()?.total === 0);
  /** The address names a site or an edition that is not there. */
  protected readonly isLost = computed(() => {
    const { siteId, source } = this.store.address();
    const [sites, editions] = [this.store.sites.value(), this.store.editions.value()];
    const isSiteLost = siteId !== undefined && sites !== undefined && !this.store.site();
    const isListLost =
      source?.kind === 'edition' && editions !== undefined && !this.store.edition();
    return (isSiteLost && !this.hasNoSite()) || isListLost;
  });
  protected readonly assumed = computed(() => {
    const { source } = this.store.address();
    return source?.kind === 'every-channel' ? source.fieldDb : null;
  });

  protected reload(): void {
    for (const each of this.remotes) if (each.problem()) each.reload();
  }

  protected async keepPlan(): Promise<void> {
    const data = this.planToKeep();
    if (!data) return;
    const opened = this.dialog.open<KeepPlan, PlanToKeep, Plan>(KeepPlan, {
      data,
      viewContainerRef: this.viewContainerRef,
      width: '32rem',
    });
    const kept = await firstValueFrom(opened.afterClosed());
    if (kept) this.kept.set(kept);
  }

  private planToKeep(): PlanToKeep | undefined {
    const [site, receiver] = [this.store.site(), this.store.receiver.value()];
    const { source } = this.store.address();
    if (!site || !receiver || !source) return undefined;
    const ifHz = this.store.trialHz();
    return {
      suggestedName: $localize`${kilohertz(ifHz)}:frequency: kHz at ${site.name}:site:`,
      choice: {
        siteId: site.id,
        editionId: source.kind === 'edition' ? source.editionId : null,
        everyChannelDb: source.kind === 'every-channel' ? source.fieldDb : null,
        period: this.store.period(),
        ifHz,
        receiver: this.store.setUpOnTrial(),
      },
      draftName: `plan.${receiver.id}.${site.id}.${ifHz}`,
      keep: (draft) => this.store.keep(draft),
    };
  }
}
