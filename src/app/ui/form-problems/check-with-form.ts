import { ChangeDetectorRef, inject, type Signal } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import type { AbstractControl } from '@angular/forms';
import { switchMap } from 'rxjs';

/**
 * Draws a component again whenever a form changes that it was handed: messages put on fields from
 * outside would otherwise wait for the next event inside. Call while the component is made.
 */
export function checkWithForm(form: Signal<AbstractControl>): void {
  const detector = inject(ChangeDetectorRef);
  toObservable(form)
    .pipe(
      switchMap(({ events }) => events),
      takeUntilDestroyed(),
    )
    .subscribe(() => {
      detector.markForCheck();
    });
}
