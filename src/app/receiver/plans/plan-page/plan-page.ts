import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import type { Plan } from '../../../../../shared/contracts/plan';
import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { planDeletion } from '../delete-plan';
import { PlanStanding } from '../plan-standing/plan-standing';
import { PlanView } from '../plan-view/plan-view';
import { stationsOf, trialOf } from '../plan-words';
import { PlansStore } from '../plans-store';
import { SharePlan } from '../share-plan/share-plan';

/** One plan as it was kept, what has changed since, and the link by which others read it. */
@Component({
  selector: 'app-plan-page',
  templateUrl: './plan-page.html',
  styleUrl: './plan-page.scss',
  imports: [
    DatePipe,
    Loading,
    MatButtonModule,
    PlanStanding,
    PlanView,
    ProblemNote,
    RouterLink,
    SharePlan,
  ],
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

  protected async delete(plan: Plan): Promise<void> {
    try {
      if (await this.remove(plan)) await this.router.navigate(['/receivers', this.id(), 'plans']);
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
