import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';

import { trialGroups } from './trial-fields';
import { TrialRow } from './trial-row';
import { SetUpTrial } from './set-up-trial';

/** Every field of the set-up on trial, beside the saved one. */
@Component({
  selector: 'app-set-up-trial-page',
  templateUrl: './set-up-trial-page.html',
  styleUrl: './set-up-trial-page.scss',
  imports: [TrialRow],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetUpTrialPage {
  protected readonly trial = inject(SetUpTrial);

  protected readonly groups = computed(() => {
    const receiver = this.trial.onTrial();
    return receiver ? trialGroups(receiver) : [];
  });
}
