import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import * as z from 'zod';

import { type Plan, planDraft, type PlanInput } from '../../../../shared/contracts/plan';
import { toProblem } from '../../core/api-problem';
import { FormDraft } from '../../core/form-draft';
import { DraftNote } from '../../ui/draft-note/draft-note';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';

/** What is kept, but for the name and note that are asked for here. */
export interface PlanToKeep {
  readonly suggestedName: string;
  /** What is typed is kept under this name until the plan is. */
  readonly draftName: string;
  readonly choice: Omit<PlanInput, 'name' | 'note'>;
  readonly keep: (draft: PlanInput) => Promise<Plan>;
}

/** Asks for the name and note of a plan and keeps it; closes with what was kept. */
@Component({
  selector: 'app-keep-plan',
  templateUrl: './keep-plan.html',
  imports: [
    DraftNote,
    FormProblems,
    MatButtonModule,
    MatDialogModule,
    MatFormFieldModule,
    MatInputModule,
    ProblemTextPipe,
    ReactiveFormsModule,
  ],
  styles: 'mat-form-field { display: block; margin-block-start: 8px; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class KeepPlan {
  private readonly dialog = inject<MatDialogRef<KeepPlan, Plan>>(MatDialogRef);
  private readonly plan = inject<PlanToKeep>(MAT_DIALOG_DATA);

  protected readonly form = inject(NonNullableFormBuilder).group({
    name: this.plan.suggestedName,
    note: '',
  });
  protected readonly draft = new FormDraft({
    form: this.form,
    name: () => this.plan.draftName,
    shape: z.object({ name: z.string(), note: z.string() }),
    show: (typed) => {
      this.form.setValue(typed);
    },
  });
  protected readonly submission = new Submission(this.form, planDraft, toProblem);

  constructor() {
    this.draft.restore();
  }

  protected discard(): void {
    this.form.setValue({ name: this.plan.suggestedName, note: '' });
    this.draft.remove();
  }

  protected async keep(): Promise<void> {
    const value = { ...this.plan.choice, ...this.form.getRawValue() };
    const kept = await this.submission.send(value, (valid) => this.plan.keep(valid));
    if (!kept) return;
    this.draft.remove();
    this.dialog.close(kept);
  }
}
