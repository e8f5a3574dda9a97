import { inject } from '@angular/core';
import type { CanDeactivateFn } from '@angular/router';

import { Confirm } from './confirm/confirm';

/** A page with work on it that may not be saved yet. */
export interface Unsaved {
  hasUnsavedChanges(): boolean;
}

/** Asks before leaving a page with unsaved work. */
export const unsavedChangesGuard: CanDeactivateFn<Unsaved> = (page) =>
  !page.hasUnsavedChanges() ||
  inject(Confirm).ask({
    title: $localize`Leave without saving?`,
    text: $localize`What you changed here is not saved yet.`,
    agree: $localize`Leave`,
    decline: $localize`Stay here`,
  });
