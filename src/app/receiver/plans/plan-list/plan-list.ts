import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatCheckboxModule } from '@angular/material/checkbox';
import { Router, RouterLink } from '@angular/router';

import type { Plan } from '../../../../../shared/contracts/plan';
import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import { Empty } from '../../../ui/page-state/empty';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { planDeletion } from '../delete-plan';
import { notesOn, stationsOf, trialOf } from '../plan-words';
import { PlansStore } from '../plans-store';

/** Plans kept for a receiver, the newest first. */
@Component({
  selector: 'app-plan-list',
  templateUrl: './plan-list.html',
  styleUrl: './plan-list.scss',
  imports: [
    DatePipe,
    Empty,
    FrequencyPipe,
    Loading,
    MatButtonModule,
    MatCheckboxModule,
    ProblemNote,
    RouterLink,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanList {
  private readonly remove = planDeletion();
  private readonly router = inject(Router);

  /** Id of the receiver, from the address. */
  readonly id = input.required<string>();

  protected readonly plans = inject(PlansStore).all(this.id);
  protected readonly refusal = signal<Problem | null>(null);
  protected readonly stationsOf = stationsOf;
  protected readonly trialOf = trialOf;
  protected readonly notesOn = notesOn;
  /** Plans chosen to be compared, in the order in which they were. */
  protected readonly chosen = signal<readonly number[]>([]);
  /** The two plans to compare, the older first. */
  protected readonly pair = computed(() => {
    const [a, b, more] = [...this.chosen()].sort((one, other) => one - other);
    return a === undefined || b === undefined || more !== undefined ? undefined : { a, b };
  });

  protected chooseLabel({ name }: Plan): string {
    return $localize`Choose ${name}:plan: to compare`;
  }

  /** A third choice takes the place of the first. */
  protected choose(id: number, isChosen: boolean): void {
    this.chosen.update((chosen) => {
      const others = chosen.filter((each) => each !== id);
      return isChosen ? [...others.slice(-1), id] : others;
    });
  }

  protected compare(): void {
    void this.router.navigate(['/receivers', this.id(), 'plans', 'compare'], {
      queryParams: this.pair() ?? {},
    });
  }

  protected async delete(plan: Plan): Promise<void> {
    try {
      if (await this.remove(plan)) this.plans.reload();
      this.refusal.set(null);
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
