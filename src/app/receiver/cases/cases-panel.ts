import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { change, tenths } from '../../charts/readings';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { ASSUMED_FIELD_DB } from '../trial/station-source';
import { CaseStore } from './case-store';

const EVERY_CHANNEL = 0;

/** One IF for several sites and lists: which they are, and what each says of the IF on trial. */
@Component({
  selector: 'app-cases-panel',
  templateUrl: './cases-panel.html',
  styleUrl: './cases-panel.scss',
  imports: [MatButtonModule, MatFormFieldModule, MatSelectModule, ProblemNote],
  providers: [CaseStore],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CasesPanel {
  private readonly receiver = inject(ReceiverStore);
  protected readonly store = inject(CaseStore);

  protected readonly everyChannel = EVERY_CHANNEL;
  protected readonly sites = computed(() => this.receiver.sites.value()?.items ?? []);
  protected readonly editions = computed(() => this.receiver.editions.value()?.items ?? []);
  protected readonly siteId = signal<number | null>(null);
  protected readonly listId = signal<number>(EVERY_CHANNEL);
  protected readonly problem = signal('');

  protected readonly rows = computed(() =>
    this.store.rows().map(({ verdict, ...row }) => ({
      ...row,
      now: verdict && tenths(verdict.nowDb),
      then: verdict && tenths(verdict.thenDb),
      change: verdict && change(verdict.thenDb - verdict.nowDb),
    })),
  );

  protected async add(): Promise<void> {
    const [siteId, editionId] = [this.siteId(), this.listId()];
    this.problem.set(siteId === null ? $localize`Choose a site first.` : '');
    if (siteId === null) return;
    const source =
      editionId === EVERY_CHANNEL
        ? ({ kind: 'every-channel', fieldDb: ASSUMED_FIELD_DB } as const)
        : ({ kind: 'edition', editionId } as const);
    await this.store.add({ siteId, source });
    this.siteId.set(null);
  }
}
