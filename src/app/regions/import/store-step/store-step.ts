import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatProgressBarModule } from '@angular/material/progress-bar';

import { type ImportMatching, importMatching } from '../../../../../shared/contracts/list-import';
import type { Problem } from '../../../../../shared/contracts/problem';
import { nameText } from '../../../../../shared/contracts/quantities';
import { toProblem } from '../../../core/api-problem';
import { FormProblems } from '../../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../../ui/form-problems/submission';
import { ImportStore } from '../import-store';
import { RowCounts } from '../row-counts/row-counts';
import { StepHeading } from '../step-heading';

const named = importMatching.required({ columns: true, date: true }).extend({ label: nameText });

const EDITION_CHANGED = 'edition-changed';

function storeProblem(error: unknown): Problem {
  const problem = toProblem(error);
  if (problem.type !== EDITION_CHANGED) return problem;
  const title = $localize`Another edition was stored or undone since this list was checked. The counts are new now: store it if they are right.`;
  return { ...problem, title };
}

/** Fourth step: what the edition is called, and storing it. */
@Component({
  selector: 'app-store-step',
  imports: [
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatProgressBarModule,
    ProblemTextPipe,
    ReactiveFormsModule,
    RowCounts,
    StepHeading,
  ],
  templateUrl: './store-step.html',
  styleUrls: ['../step.scss', './store-step.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StoreStep {
  protected readonly list = inject(ImportStore);

  protected readonly isStoring = computed(() => this.list.state()?.state === 'committing');
  protected readonly percent = computed(() => Math.round((this.list.state()?.progress ?? 0) * 100));
  protected readonly form = new FormGroup({
    label: new FormControl(this.list.state()?.label ?? '', { nonNullable: true }),
    date: new FormControl(this.list.state()?.date ?? '', { nonNullable: true }),
  });
  protected readonly submission = new Submission(this.form, named, storeProblem);

  protected async store(): Promise<void> {
    const columns = this.list.state()?.proposal.columns;
    await this.submission.send({ ...this.form.getRawValue(), columns }, async (matching) => {
      const { label, date } = this.list.state() ?? {};
      // The name goes with the check: another name is checked again, by the same columns.
      if (matching.label !== label || matching.date !== date) await this.list.check(matching);
      await this.commit(matching);
    });
  }

  protected async cancel(): Promise<void> {
    await this.list.remove().catch(() => {
      this.list.refresh();
    });
  }

  /** Where another edition came in between, the counts are made anew before one decides again. */
  private async commit(matching: ImportMatching): Promise<void> {
    try {
      await this.list.commit();
    } catch (error) {
      if (toProblem(error).type === EDITION_CHANGED) await this.list.check(matching);
      throw error;
    }
  }
}
