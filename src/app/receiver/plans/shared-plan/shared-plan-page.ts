import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';

import { sharedPlan } from '../../../../../shared/contracts/plan';
import { remote } from '../../../core/remote';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { PlanView } from '../plan-view/plan-view';
import { stationsOf } from '../plan-words';

/** A plan for whoever has its link: to be read, without signing in. */
@Component({
  selector: 'app-shared-plan-page',
  templateUrl: './shared-plan-page.html',
  styleUrl: './shared-plan-page.scss',
  imports: [DatePipe, Loading, MatButtonModule, PlanView, ProblemNote, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SharedPlanPage {
  /** Secret end of the link, from the address. */
  readonly token = input.required<string>();

  protected readonly plan = remote(
    () => `/api/shared-plans/${encodeURIComponent(this.token())}`,
    sharedPlan,
  );
  protected readonly stationsOf = stationsOf;
}
