import { ChangeDetectionStrategy, Component, effect, input } from '@angular/core';
import { outputFromObservable } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { debounceTime, distinctUntilChanged, filter, map } from 'rxjs';

import { Icon } from '../../ui/icon/icon';

const PAUSE_MS = 300;

/** Searches while one types, once there is a pause. */
@Component({
  selector: 'app-search-field',
  imports: [Icon, MatFormFieldModule, MatInputModule, ReactiveFormsModule],
  template: `
    <mat-form-field>
      <mat-label i18n>Find by name, call sign or frequency</mat-label>
      <app-icon matPrefix name="search" />
      <input matInput type="search" maxlength="100" [formControl]="box" />
    </mat-form-field>
  `,
  styles: `
    mat-form-field {
      width: 100%;
    }
    app-icon {
      margin-inline: 0.75rem 0.25rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SearchField {
  /** What is searched for at present. */
  readonly text = input.required<string>();

  protected readonly box = new FormControl('', { nonNullable: true });

  readonly searched = outputFromObservable(
    this.box.valueChanges.pipe(
      debounceTime(PAUSE_MS),
      map((text) => text.trim()),
      distinctUntilChanged(),
      filter((text) => text !== this.text()),
    ),
  );

  constructor() {
    effect(() => {
      const text = this.text();
      if (this.box.value.trim() !== text) this.box.setValue(text, { emitEvent: false });
    });
  }
}
