import { DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { AbstractControl } from '@angular/forms';
import { debounceTime, filter } from 'rxjs';
import type * as z from 'zod';

import { Drafts } from './drafts';

const PAUSE_MS = 400;

/** What a form drafts, and how a draft is shown in it again. */
export interface Drafted<T> {
  readonly form: AbstractControl;
  /** Name of the draft, such as "site.3". */
  readonly name: () => string;
  /** What is typed, not what is valid; a draft of another shape is passed over. */
  readonly shape: z.ZodType<T>;
  readonly show: (typed: T) => void;
}

/** Keeps what is typed in a form beyond a closed tab. Create it in an injection context. */
export class FormDraft<T> {
  private readonly drafts = inject(Drafts);
  private readonly restored = signal(false);
  private readonly drafted: Drafted<T>;

  /** Whether the form shows a draft instead of what is stored. */
  readonly isRestored = this.restored.asReadonly();

  constructor(drafted: Drafted<T>) {
    this.drafted = drafted;
    drafted.form.valueChanges
      .pipe(
        debounceTime(PAUSE_MS),
        filter(() => drafted.form.dirty),
        takeUntilDestroyed(inject(DestroyRef)),
      )
      .subscribe(() => {
        this.drafts.write(drafted.name(), drafted.form.getRawValue());
      });
  }

  /** Shows the draft, if there is one. */
  restore(): void {
    const typed = this.drafted.shape.safeParse(this.drafts.read(this.drafted.name()));
    if (!typed.success) return;
    this.drafted.show(typed.data);
    this.drafted.form.markAsDirty();
    this.restored.set(true);
  }

  /** The work is saved, or given up. */
  remove(): void {
    this.drafted.form.markAsPristine();
    this.drafts.remove(this.drafted.name());
    this.restored.set(false);
  }
}
