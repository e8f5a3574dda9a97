import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import { Router, RouterLink } from '@angular/router';

import type { Period } from '../../../../../shared/radio/site';
import { Empty } from '../../../ui/page-state/empty';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { DifferenceTable } from '../../../ui/receiver-differences/difference-table';
import { differences } from '../../../ui/receiver-differences/differences';
import { PlansStore } from '../plans-store';
import { ComparedTerms } from './compared-terms';
import { comparedHarm, comparedTerms, comparisonSentence } from './comparison';
import { HarmLists } from './harm-lists';

/** Two plans beside each other: what got better and what worse. */
@Component({
  selector: 'app-compare-page',
  templateUrl: './compare-page.html',
  styleUrl: './compare-page.scss',
  imports: [
    ComparedTerms,
    DifferenceTable,
    Empty,
    HarmLists,
    Loading,
    MatButtonModule,
    MatButtonToggleModule,
    MatFormFieldModule,
    MatSelectModule,
    ProblemNote,
    RouterLink,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ComparePage {
  private readonly store = inject(PlansStore);
  private readonly router = inject(Router);

  /** Id of the receiver, and of the two plans, from the address. */
  readonly id = input.required<string>();
  readonly a = input<string>();
  readonly b = input<string>();

  protected readonly all = this.store.all(this.id);
  protected readonly first = this.store.one(this.id, this.a);
  protected readonly second = this.store.one(this.id, this.b);

  private readonly remotes = [this.all, this.first, this.second];
  protected readonly problem = computed(() =>
    this.remotes.map(({ problem }) => problem()).find((each) => each !== undefined),
  );
  protected readonly isChosen = computed(() => this.a() !== undefined && this.b() !== undefined);
  protected readonly plans = computed(() => {
    const [first, second] = [this.first.value(), this.second.value()];
    return first && second ? ([first, second] as const) : undefined;
  });
  protected readonly period = linkedSignal<Period>(() => this.second.value()?.period ?? 'night');

  protected readonly compared = computed(() => {
    const plans = this.plans();
    if (!plans) return undefined;
    const [first, second] = plans;
    const terms = comparedTerms(plans, this.period());
    const harm = comparedHarm(plans, this.period());
    const setUp = differences(first.receiver, second.receiver);
    return { plans, terms, harm, setUp, sentence: comparisonSentence(terms, harm) };
  });

  protected choose(which: 'a' | 'b', id: number): void {
    void this.router.navigate([], {
      queryParams: { [which]: id },
      queryParamsHandling: 'merge',
      replaceUrl: true,
    });
  }

  protected swap(): void {
    void this.router.navigate([], { queryParams: { a: this.b(), b: this.a() } });
  }

  protected reload(): void {
    for (const each of this.remotes) if (each.problem()) each.reload();
  }
}
