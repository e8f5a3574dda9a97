import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import type { Plan } from '../../../../../shared/contracts/plan';
import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { Caution } from '../../advice/caution';
import { planDeletion } from '../delete-plan';
import { planTerms, planVerdicts } from '../plan-terms';
import { stationsOf, trialOf } from '../plan-words';
import { PlansStore } from '../plans-store';

/** One plan as it was kept: the chosen IF beside the one before it. */
@Component({
  selector: 'app-plan-page',
  templateUrl: './plan-page.html',
  styleUrl: './plan-page.scss',
  imports: [Caution, DatePipe, FrequencyPipe, Loading, MatButtonModule, ProblemNote, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanPage {
  private readonly router = inject(Router);
  private readonly remove = planDeletion();

  /** Ids of receiver and plan, from the address. */
  readonly id = input.required<string>();
  readonly planId = input.required<string>();

  protected readonly plan = inject(PlansStore).one(this.id, this.planId);
  protected readonly refusal = signal<Problem | null>(null);
  protected readonly stationsOf = stationsOf;
  protected readonly trialOf = trialOf;
  protected readonly verdicts = computed(() => {
    const plan = this.plan.value();
    return plan ? planVerdicts(plan) : [];
  });
  protected readonly terms = computed(() => {
    const plan = this.plan.value();
    return plan ? planTerms(plan) : [];
  });

  protected async delete(plan: Plan): Promise<void> {
    try {
      if (await this.remove(plan)) await this.router.navigate(['/receivers', this.id(), 'plans']);
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
