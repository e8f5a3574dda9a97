import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  effect,
  inject,
  input,
  signal,
  untracked,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { RouterLink } from '@angular/router';

import type { ReceiverVerdicts } from '../../../../shared/contracts/edition-verdicts';
import type { Problem } from '../../../../shared/contracts/problem';
import type { Period } from '../../../../shared/radio/site';
import { toProblem } from '../../core/api-problem';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { EditionStore } from '../edition-store';
import { causeSentence, verdictSentence } from './verdict-words';

/** Between which editions, where and when receivers are judged. */
interface Asked {
  readonly editionId: string;
  readonly against: number;
  readonly siteId: number;
  readonly period: Period;
}

/** Whose verdict is another because of what changed; judged a few receivers at a time. */
@Component({
  selector: 'app-verdict-changes',
  imports: [MatButtonModule, MatProgressBarModule, ProblemNote, RouterLink],
  templateUrl: './verdict-changes.html',
  styleUrl: './verdict-changes.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class VerdictChanges {
  private readonly store = inject(EditionStore);

  readonly editionId = input.required<string>();
  readonly against = input.required<number>();
  readonly siteId = input.required<number>();
  readonly period = input.required<Period>();

  /** The run whose answers count; an older one stops at its next page. */
  private run = 0;
  protected readonly judged = signal<readonly ReceiverVerdicts[]>([]);
  protected readonly total = signal<number | null>(null);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly isDone = computed(() => this.judged().length >= (this.total() ?? Infinity));
  protected readonly changed = computed(() =>
    this.judged()
      .filter(({ changed }) => changed)
      .map((each) => ({
        ...each,
        sentences: {
          before: each.before ? verdictSentence(each.before) : '',
          after: each.after ? verdictSentence(each.after) : '',
        },
        because: each.causes.map(causeSentence),
      })),
  );
  protected readonly unchanged = computed(() =>
    this.judged().filter(({ changed, reason }) => !changed && reason === null),
  );
  protected readonly unjudged = computed(() =>
    this.judged().filter(({ reason }) => reason !== null),
  );
  protected readonly share = computed(() =>
    this.total() ? (100 * this.judged().length) / (this.total() ?? 1) : 0,
  );

  constructor() {
    effect(() => {
      const asked = this.asked();
      untracked(() => void this.judge(asked));
    });
    inject(DestroyRef).onDestroy(() => {
      this.run += 1;
    });
  }

  protected again(): void {
    void this.judge(this.asked());
  }

  private asked(): Asked {
    return {
      editionId: this.editionId(),
      against: this.against(),
      siteId: this.siteId(),
      period: this.period(),
    };
  }

  private async judge({ editionId, ...request }: Asked): Promise<void> {
    const run = ++this.run;
    this.judged.set([]);
    this.total.set(null);
    this.problem.set(null);
    try {
      for (let page = 1; run === this.run && !this.isDone(); page++) {
        const { items, total } = await this.store.verdicts(editionId, { ...request, page });
        if (run !== this.run) return;
        this.total.set(items.length === 0 ? this.judged().length : total);
        this.judged.update((before) => [...before, ...items]);
      }
    } catch (error) {
      if (run === this.run) this.problem.set(toProblem(error));
    }
  }
}
