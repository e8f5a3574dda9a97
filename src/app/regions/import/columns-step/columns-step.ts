import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatProgressBarModule } from '@angular/material/progress-bar';

import { importMatching, type ImportProposal } from '../../../../../shared/contracts/list-import';
import { toProblem } from '../../../core/api-problem';
import { FormProblems } from '../../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../../ui/form-problems/submission';
import { ImportStore } from '../import-store';
import { FIELDS, openUnits, unitWords } from '../list-words';
import { type ColumnForm, matchingForm, matchingOf, unitsOf } from '../matching-form';
import { SampleTable } from '../sample-table/sample-table';
import { StepHeading } from '../step-heading';

const EXAMPLES = 3;

/** Second step: what was found in the file, and what each column holds. */
@Component({
  selector: 'app-columns-step',
  imports: [
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatProgressBarModule,
    ProblemTextPipe,
    ReactiveFormsModule,
    SampleTable,
    StepHeading,
  ],
  templateUrl: './columns-step.html',
  styleUrls: ['../step.scss', './columns-step.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ColumnsStep {
  protected readonly list = inject(ImportStore);

  protected readonly fields = FIELDS;
  protected readonly unitWords = unitWords;
  protected readonly unitsOf = unitsOf;
  protected readonly proposal = computed(() => this.list.state()?.proposal);
  /** Headers of the columns whose unit nobody but the user knows. */
  protected readonly unclear = computed(() => openUnits(this.proposal()?.columns ?? []));
  /** The first values of each column, so that one sees what it holds. */
  protected readonly examples = computed(() => examplesOf(this.proposal()));
  protected readonly form = matchingForm(this.proposal()?.columns ?? []);
  protected readonly submission = new Submission(this.form, importMatching, toProblem);
  protected readonly isChecking = computed(
    () => this.submission.isBusy() || this.list.state()?.state === 'checking',
  );

  protected fieldLabel(header: string): string {
    return $localize`What ${header}:column: holds`;
  }

  protected unitLabel(header: string): string {
    return $localize`Unit of ${header}:column:`;
  }

  protected async check(): Promise<void> {
    const { label, date } = this.list.state() ?? {};
    const kept = { ...(label ? { label } : {}), ...(date ? { date } : {}) };
    const isDone = await this.submission.send(
      { columns: matchingOf(this.form), ...kept },
      (valid) => this.list.check(valid).then(() => true),
    );
    if (isDone) this.list.goTo('check');
  }

  /** A field of one unit needs no question; another field's unit makes no sense. */
  protected fieldChanged(column: ColumnForm): void {
    const { unit } = column.controls;
    const units = unitsOf(column);
    if (unit.value !== null && !units.includes(unit.value)) unit.setValue(null);
  }
}

function examplesOf(proposal: ImportProposal | undefined): string[] {
  if (!proposal) return [];
  return proposal.columns.map((_column, index) => {
    const values = proposal.sample.map((row) => row[index] ?? '').filter((cell) => cell !== '');
    return [...new Set(values)].slice(0, EXAMPLES).join(' · ');
  });
}
