import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';

import { kilohertz } from '../../charts/readings';
import { Icon } from '../../ui/icon/icon';
import { TrialStore } from '../trial/trial-store';
import { type Advice } from './advice';
import { Caution } from './caution';
import { verdictSentences } from './verdict-words';

/** A warning that names the site or the stations is about what the models know of them. */
const isOfSurroundings = (path: string): boolean => /^(site|stations)\b/.test(path);

/** What to do about the IF, and what the set is like with the IF on trial. */
@Component({
  selector: 'app-advice-panel',
  templateUrl: './advice-panel.html',
  styleUrl: './advice-panel.scss',
  imports: [Caution, Icon, MatButtonModule, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { 'aria-live': 'polite' },
})
export class AdvicePanel {
  protected readonly store = inject(TrialStore);

  readonly advice = input.required<Advice>();

  protected readonly verdict = computed(() => {
    const judged = this.store.judged.value();
    if (!judged) return [];
    const present = this.store.isMoved() ? this.store.present.value() : undefined;
    return verdictSentences(judged.verdict, present, this.store.period(), this.store.nameOf);
  });
  protected readonly target = computed(() => kilohertz(this.advice().ifHz));
  private readonly warnings = computed(() => this.store.judged.value()?.warnings ?? []);
  /** What should be looked at in the set-up. */
  protected readonly ofReceiver = computed(() =>
    this.warnings().filter(({ path }) => !isOfSurroundings(path)),
  );
  /** Where the models are carried beyond what they are known for. */
  protected readonly ofModels = computed(() =>
    this.warnings().filter(({ path }) => isOfSurroundings(path)),
  );
  protected readonly onTrial = computed(() => kilohertz(this.store.trialHz()));
  /** The list that stations were left out of; null: none is used. */
  protected readonly editionId = computed(() => {
    const source = this.store.setup()?.source;
    return source?.kind === 'edition' ? source.editionId : null;
  });
  protected readonly skipped = computed(() => {
    const counts = new Map<string, number>();
    for (const { reason } of this.store.judged.value()?.skipped ?? []) {
      counts.set(reason, (counts.get(reason) ?? 0) + 1);
    }
    return [...counts].map(([reason, count]) => ({ reason, count }));
  });
}
