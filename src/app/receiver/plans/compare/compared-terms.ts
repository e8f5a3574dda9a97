import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';

import type { Plan } from '../../../../../shared/contracts/plan';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import { stationsOf } from '../plan-words';
import type { ComparedTerm } from './comparison';
import { OutcomeMark } from './outcome-mark';

/** Every term of two plans, and how the second stands to the first in it. */
@Component({
  selector: 'app-compared-terms',
  templateUrl: './compared-terms.html',
  styleUrl: './compared-terms.scss',
  imports: [DatePipe, FrequencyPipe, OutcomeMark, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ComparedTerms {
  readonly plans = input.required<readonly Plan[]>();
  readonly terms = input.required<readonly ComparedTerm[]>();

  /** Site and list of both, where they are the same. */
  protected readonly shared = computed(() => {
    const [first, ...others] = this.plans().map(whereOf);
    return first !== undefined && others.every((each) => each === first) ? first : null;
  });
  protected readonly whereOf = whereOf;
}

const whereOf = (plan: Plan): string => `${plan.siteName} · ${stationsOf(plan)}`;
