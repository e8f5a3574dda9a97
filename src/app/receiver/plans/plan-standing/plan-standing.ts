import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import type { Plan } from '../../../../../shared/contracts/plan';
import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { Icon } from '../../../ui/icon/icon';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { judgedAnew, trialOf } from '../plan-words';
import { PlansStore } from '../plans-store';

/** Says what has changed since a plan was judged, and judges it again as a new plan. */
@Component({
  selector: 'app-plan-standing',
  templateUrl: './plan-standing.html',
  styleUrl: './plan-standing.scss',
  imports: [DatePipe, Icon, MatButtonModule, ProblemNote, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanStanding {
  private readonly store = inject(PlansStore);
  private readonly router = inject(Router);

  readonly plan = input.required<Plan>();

  protected readonly isBusy = signal(false);
  protected readonly refusal = signal<Problem | null>(null);
  protected readonly trialOf = trialOf;
  protected readonly isStale = computed(() => {
    const { newerEdition, ...changed } = this.plan().standing;
    return newerEdition !== null || Object.values(changed).includes(true);
  });
  protected readonly anew = computed(() => judgedAnew(this.plan()));

  /** Keeps a new plan and shows it beside this one. */
  protected async judgeAgain(): Promise<void> {
    const draft = this.anew();
    const { id, receiverId } = this.plan();
    if (!draft) return;
    this.isBusy.set(true);
    this.refusal.set(null);
    try {
      const kept = await this.store.keep(receiverId, draft);
      await this.router.navigate(['/receivers', receiverId, 'plans', 'compare'], {
        queryParams: { a: id, b: kept.id },
      });
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
    this.isBusy.set(false);
  }
}
