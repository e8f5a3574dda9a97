import { ChangeDetectionStrategy, Component, computed, input, linkedSignal } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';

import type { ReadablePlan } from '../../../../../shared/contracts/plan';
import type { Period } from '../../../../../shared/radio/site';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import { Caution } from '../../advice/caution';
import { planVerdicts } from '../plan-terms';
import { PlanFacts } from './plan-facts';
import { PlanHeard } from './plan-heard';
import { PlanTermsTable } from './plan-terms-table';

/** All that a plan says: before and after in words, the dial, what is heard and why, every term. */
@Component({
  selector: 'app-plan-view',
  templateUrl: './plan-view.html',
  styleUrl: './plan-view.scss',
  imports: [Caution, FrequencyPipe, MatButtonToggleModule, PlanFacts, PlanHeard, PlanTermsTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanView {
  readonly plan = input.required<ReadablePlan>();

  protected readonly period = linkedSignal<Period>(() => this.plan().period);
  protected readonly isMoved = computed(() => this.plan().ifHz !== this.plan().receiver.ifHz);
  protected readonly verdicts = computed(() => planVerdicts(this.plan(), this.period()));
}
