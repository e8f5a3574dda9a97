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
import { CompletesField } from '../completes-field/completes-field';
import { ImportStore } from '../import-store';
import { FIELDS, openUnits, unitWords } from '../list-words';
import { type ColumnForm, matchingForm, matchingOf, patternOf, unitsOf } from '../matching-form';

const EXAMPLES = 3;
const NOTHING = { columns: [], letterO: null, completes: null, addsTo: null };

/** What each column holds, and whatever else only the user knows. */
@Component({
  selector: 'app-column-fields',
  imports: [
    CompletesField,
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatProgressBarModule,
    ProblemTextPipe,
    ReactiveFormsModule,
  ],
  templateUrl: './column-fields.html',
  styleUrl: './column-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ColumnFields {
  private readonly list = inject(ImportStore);

  protected readonly fields = FIELDS;
  protected readonly unitWords = unitWords;
  protected readonly unitsOf = unitsOf;
  protected readonly proposal = computed(() => this.list.state()?.proposal);
  /** Headers of the columns whose unit nobody but the user knows. */
  protected readonly unclear = computed(() => openUnits(this.proposal()?.columns ?? []));
  /** The first values of each column, so that one sees what it holds. */
  protected readonly examples = computed(() => examplesOf(this.proposal()));
  protected readonly form = matchingForm(this.proposal() ?? NOTHING);
  protected readonly submission = new Submission(this.form, importMatching, toProblem);
  protected readonly isChecking = computed(
    () => this.submission.isBusy() || this.list.state()?.state === 'checking',
  );

  /** Further bearings of a pattern are answered with the first. */
  protected followers(column: ColumnForm): readonly ColumnForm[] {
    const [first, ...others] = patternOf(this.form.controls.columns.controls);
    return column === first ? others : [];
  }

  protected isFollower(column: ColumnForm): boolean {
    const [first] = patternOf(this.form.controls.columns.controls);
    return column.controls.field.value === 'pattern' && column !== first;
  }

  protected fieldLabel(header: string): string {
    return $localize`What ${header}:column: holds`;
  }

  protected unitLabel(header: string): string {
    return $localize`Unit of ${header}:column:`;
  }

  protected async check(): Promise<void> {
    const { label, date } = this.list.state() ?? {};
    const kept = { ...(label ? { label } : {}), ...(date ? { date } : {}) };
    const matching = matchingOf(this.form);
    // A name that was given to a list of its own does not suit the edition it completes.
    const isSame = matching.addsTo === this.proposal()?.addsTo;
    const isDone = await this.submission.send({ ...matching, ...(isSame ? kept : {}) }, (valid) =>
      this.list.check(valid).then(() => true),
    );
    if (isDone) this.list.goTo('check');
  }

  /** A field of one unit needs no question; another field's unit makes no sense. */
  protected fieldChanged(column: ColumnForm): void {
    const { unit } = column.controls;
    const units = unitsOf(column);
    if (unit.value !== null && !units.includes(unit.value)) unit.setValue(null);
  }

  protected unitChanged(column: ColumnForm): void {
    for (const { controls } of this.followers(column)) {
      controls.unit.setValue(column.controls.unit.value);
    }
  }
}

function examplesOf(proposal: ImportProposal | undefined): string[] {
  if (!proposal) return [];
  return proposal.columns.map((_column, index) => {
    const values = proposal.sample.map((row) => row[index] ?? '').filter((cell) => cell !== '');
    return [...new Set(values)].slice(0, EXAMPLES).join(' · ');
  });
}
