import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatProgressBarModule } from '@angular/material/progress-bar';

import { ProblemNote } from '../../ui/page-state/problem-note';
import { TrialStore } from '../trial/trial-store';

/** Whether something is being computed, and what went wrong if it could not be. */
@Component({
  selector: 'app-trial-progress',
  template: `
    <div class="progress">
      @if (store.isLoading()) {
        <mat-progress-bar mode="indeterminate" aria-label="Computing" i18n-aria-label />
      }
    </div>
    @if (store.problem(); as problem) {
      <app-problem-note [problem]="problem" (retry)="store.retry()" />
    }
  `,
  styles: `
    .progress {
      height: 4px;
    }
  `,
  imports: [MatProgressBarModule, ProblemNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialProgress {
  protected readonly store = inject(TrialStore);
}
