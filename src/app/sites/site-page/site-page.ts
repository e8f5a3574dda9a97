import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import type { Problem } from '../../../../shared/contracts/problem';
import { toProblem } from '../../core/api-problem';
import { FormDraft } from '../../core/form-draft';
import { Confirm } from '../../ui/confirm/confirm';
import { DraftNote } from '../../ui/draft-note/draft-note';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { Submission } from '../../ui/form-problems/submission';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import type { Unsaved } from '../../ui/unsaved-changes-guard';
import { draftOf, fill, siteForm, siteToSave, siteTyped } from '../site-form';
import { SiteStore } from '../site-store';
import { SiteFields } from './site-fields';

/** A new site, or one to be changed. */
@Component({
  selector: 'app-site-page',
  imports: [
    DraftNote,
    FormProblems,
    Loading,
    MatButtonModule,
    ProblemNote,
    ReactiveFormsModule,
    RouterLink,
    SiteFields,
  ],
  templateUrl: './site-page.html',
  styleUrl: './site-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SitePage implements Unsaved {
  private readonly store = inject(SiteStore);
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);

  /** Id of the site in the address; a new one has none. */
  readonly id = input<string>();

  protected readonly site = this.store.one(this.id);
  protected readonly isEditable = computed(() => this.site.value()?.editable ?? true);
  protected readonly isReady = computed(
    () => this.id() === undefined || this.site.value() !== undefined,
  );
  protected readonly form = siteForm();
  /** Why the site could not be deleted. */
  protected readonly refusal = signal<Problem | null>(null);
  protected readonly submission = new Submission(this.form, siteToSave, toProblem);

  protected readonly draft = new FormDraft({
    form: this.form,
    name: () => `site.${this.id() ?? 'new'}`,
    shape: siteTyped,
    show: (typed) => {
      this.form.setValue(typed);
    },
  });

  constructor() {
    effect(() => {
      if (!this.isReady()) return;
      this.showStored();
      if (this.isEditable()) this.draft.restore();
    });
  }

  hasUnsavedChanges(): boolean {
    return this.form.dirty;
  }

  protected async save(): Promise<void> {
    const saved = await this.submission.send(draftOf(this.form), (valid) =>
      this.store.save(valid, this.id()),
    );
    if (saved) await this.leave();
  }

  protected async remove(id: string): Promise<void> {
    const agreed = await this.confirm.ask({
      title: $localize`Delete ${this.form.controls.name.value}:site:?`,
      text: $localize`Plans kept for this site stay as they are; no new ones can be made for it.`,
      agree: $localize`Delete the site`,
      decline: $localize`Keep it`,
    });
    if (!agreed) return;
    try {
      await this.store.remove(id);
      await this.leave();
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }

  protected discardDraft(): void {
    this.draft.remove();
    this.showStored();
  }

  /** A new site is shown as the form begins. */
  private showStored(): void {
    const site = this.site.value();
    if (site) fill(this.form, site);
    else this.form.reset(siteForm().getRawValue());
  }

  private async leave(): Promise<void> {
    this.draft.remove();
    await this.router.navigate(['/sites']);
  }
}
