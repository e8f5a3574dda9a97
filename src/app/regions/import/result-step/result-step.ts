import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';

import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { Confirm } from '../../../ui/confirm/confirm';
import { Icon } from '../../../ui/icon/icon';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { ImportStore } from '../import-store';
import { RowCounts } from '../row-counts/row-counts';
import { StepHeading } from '../step-heading';

/** Last step: what has become of the import. */
@Component({
  selector: 'app-result-step',
  imports: [Icon, MatButtonModule, ProblemNote, RouterLink, RowCounts, StepHeading],
  templateUrl: './result-step.html',
  styleUrl: '../step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResultStep {
  private readonly confirm = inject(Confirm);
  protected readonly list = inject(ImportStore);

  /** Why the import could not be undone. */
  protected readonly refusal = signal<Problem | null>(null);

  protected async undo(): Promise<void> {
    const agreed = await this.confirm.ask({
      title: $localize`Undo this import?`,
      text: $localize`The edition goes, with all its stations. Older editions stay, and so do plans that were judged against it.`,
      agree: $localize`Undo the import`,
      decline: $localize`Keep the edition`,
    });
    if (!agreed) return;
    this.refusal.set(null);
    await this.list.remove().catch((error: unknown) => {
      this.refusal.set(toProblem(error));
    });
  }
}
