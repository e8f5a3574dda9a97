import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { whole } from '../../charts/readings';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { Caution } from '../advice/caution';
import { TrialStore } from '../trial/trial-store';
import { CureTrial } from './cure-trial';
import { costText, curesSentence, gainOf, gainWords, LEAST_GAIN_DB } from './cure-words';

/** What can be done about what the set lets through: gain, cost and parts; each goes on trial. */
@Component({
  selector: 'app-cures-table',
  templateUrl: './cures-table.html',
  styleUrl: './cures-table.scss',
  imports: [Caution, MatButtonModule, ProblemNote],
  providers: [CureTrial],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CuresTable {
  private readonly trial = inject(TrialStore);
  protected readonly store = inject(CureTrial);

  protected readonly sentence = computed(() =>
    curesSentence(this.store.cures().map(({ cure }) => cure)),
  );
  private readonly mostDb = computed(() =>
    Math.max(
      1,
      ...this.store.cures().flatMap(({ cure }) => [cure.deficitBeforeDb, cure.deficitAfterDb]),
    ),
  );
  /** Those that gain nothing are shown on demand, unless one of them is on trial. */
  protected readonly isWhole = signal(false);
  protected readonly rows = computed(() =>
    this.all().filter(({ isIdle, isOnTrial }) => this.isWhole() || !isIdle || isOnTrial),
  );
  protected readonly rest = computed(() => this.all().length - this.rows().length);
  private readonly all = computed(() =>
    this.store.cures().map(({ cure, ...trial }) => ({
      ...trial,
      name: cure.name,
      isIdle: gainOf(cure) < LEAST_GAIN_DB,
      parts: cure.parts,
      undo: cure.reversible ? $localize`can be undone` : $localize`cannot be undone`,
      cost: costText(cure),
      before: whole(cure.deficitBeforeDb),
      after: whole(cure.deficitAfterDb),
      share: `${Math.round((100 * cure.deficitAfterDb) / this.mostDb())}%`,
      gains: cure.gainDb.map((gain) => gainWords(gain, this.trial.nameOf)),
    })),
  );
}
