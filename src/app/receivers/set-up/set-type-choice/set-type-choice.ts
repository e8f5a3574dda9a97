import { ChangeDetectionStrategy, Component, model } from '@angular/core';
import { MatRadioModule } from '@angular/material/radio';

import { type SetType, setTypes } from '../../../core/set-types';

/** Choice of the type of set whose typical values one begins from. */
@Component({
  selector: 'app-set-type-choice',
  imports: [MatRadioModule],
  template: `
    <mat-radio-group
      i18n-aria-label
      aria-label="Type of set"
      [value]="type()"
      (change)="type.set($event.value)"
    >
      @for (each of types; track each.id) {
        <mat-radio-button [value]="each">{{ each.name }}</mat-radio-button>
      }
    </mat-radio-group>
  `,
  styles: `
    mat-radio-group {
      display: grid;
      grid-template-columns: repeat(auto-fill, minmax(min(20rem, 100%), 1fr));
      gap: 0.25rem 1rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SetTypeChoice {
  readonly type = model<SetType | null>(null);

  protected readonly types = setTypes;
}
