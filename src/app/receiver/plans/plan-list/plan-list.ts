import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';

import type { Plan } from '../../../../../shared/contracts/plan';
import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import { Empty } from '../../../ui/page-state/empty';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { planDeletion } from '../delete-plan';
import { stationsOf, trialOf } from '../plan-words';
import { PlansStore } from '../plans-store';

/** Plans kept for a receiver, the newest first. */
@Component({
  selector: 'app-plan-list',
  templateUrl: './plan-list.html',
  styleUrl: './plan-list.scss',
  imports: [DatePipe, Empty, FrequencyPipe, Loading, MatButtonModule, ProblemNote, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanList {
  private readonly remove = planDeletion();

  /** Id of the receiver, from the address. */
  readonly id = input.required<string>();

  protected readonly plans = inject(PlansStore).all(this.id);
  protected readonly refusal = signal<Problem | null>(null);
  protected readonly stationsOf = stationsOf;
  protected readonly trialOf = trialOf;

  protected async delete(plan: Plan): Promise<void> {
    try {
      if (await this.remove(plan)) this.plans.reload();
      this.refusal.set(null);
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
