import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { bareReceiver } from '../../../../shared/contracts/receiver';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { DifferenceTable } from '../../ui/receiver-differences/difference-table';
import { differences } from '../../ui/receiver-differences/differences';
import { SetUpTrial } from './set-up-trial';

/** Why the set-up on trial was not taken over, and the ways on. */
@Component({
  selector: 'app-trial-refused',
  templateUrl: './trial-refused.html',
  styles: `
    .conflict {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 8px;
      padding: 8px 12px;
      border-inline-start: 4px solid var(--fallow-alarm);
      background: var(--fallow-alarm-wash);
    }
  `,
  imports: [DifferenceTable, MatButtonModule, ProblemNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialRefused {
  protected readonly trial = inject(SetUpTrial);

  /** Where the trial and what somebody else saved differ. */
  protected readonly disputed = computed(() => {
    const [theirs, mine] = [this.trial.conflict(), this.trial.onTrial()];
    return theirs && mine ? differences(mine, bareReceiver.parse(theirs)) : [];
  });
}
