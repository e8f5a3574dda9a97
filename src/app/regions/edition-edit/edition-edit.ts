import { ChangeDetectionStrategy, Component, effect, inject, input, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';

import type { Problem } from '../../../../shared/contracts/problem';
import { type Edition, editionChange } from '../../../../shared/contracts/region';
import { toProblem } from '../../core/api-problem';
import { Confirm } from '../../ui/confirm/confirm';
import { needed } from '../../ui/form-problems/form-issues';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import type { Unsaved } from '../../ui/unsaved-changes-guard';
import { EditionStore } from '../edition-store';

/** Label, date and note of an edition. Its stations stay as they were imported. */
@Component({
  selector: 'app-edition-edit',
  imports: [
    FormProblems,
    Loading,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    ProblemNote,
    ProblemTextPipe,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './edition-edit.html',
  styleUrl: './edition-edit.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EditionEdit implements Unsaved {
  private readonly store = inject(EditionStore);
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);

  readonly id = input.required<string>();

  protected readonly edition = this.store.one(this.id);
  protected readonly form = new FormGroup({
    label: new FormControl('', {
      nonNullable: true,
      validators: needed($localize`Give a name, such as “Spring list”.`),
    }),
    date: new FormControl('', {
      nonNullable: true,
      validators: needed($localize`Give the day of the list.`),
    }),
    note: new FormControl('', { nonNullable: true }),
  });
  protected readonly submission = new Submission(this.form, editionChange, toProblem);
  /** Why the edition could not be deleted. */
  protected readonly refusal = signal<Problem | null>(null);

  constructor() {
    effect(() => {
      const edition = this.edition.value();
      if (edition && !this.form.dirty) {
        this.form.reset({ label: edition.label, date: edition.date, note: edition.note });
      }
    });
  }

  hasUnsavedChanges(): boolean {
    return this.form.dirty;
  }

  protected async save(): Promise<void> {
    const saved = await this.submission.send(this.form.getRawValue(), (valid) =>
      this.store.change(this.id(), valid),
    );
    if (!saved) return;
    this.form.markAsPristine();
    await this.router.navigate(['/editions', saved.id]);
  }

  protected async remove({ label, regionId }: Edition): Promise<void> {
    const agreed = await this.confirm.ask({
      title: $localize`Delete ${label}:edition:?`,
      text: $localize`All its stations go. Corrections by hand stay with the region. An edition against which a plan was judged cannot be deleted.`,
      agree: $localize`Delete the edition`,
      decline: $localize`Keep it`,
    });
    if (!agreed) return;
    this.refusal.set(null);
    try {
      await this.store.remove(this.id());
      this.form.markAsPristine();
      await this.router.navigate(['/regions', regionId]);
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
