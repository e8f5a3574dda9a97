import { ChangeDetectionStrategy, Component, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

/** Says that a form shows unsaved work of an earlier visit. */
@Component({
  selector: 'app-draft-note',
  imports: [MatButtonModule],
  template: `
    <p role="status" i18n>What you had typed here and not saved is back.</p>
    <button mat-button type="button" (click)="discard.emit()" i18n>Discard it</button>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      gap: 0 0.5rem;
      padding: 0.25rem 0.25rem 0.25rem 1rem;
      border-inline-start: 4px solid var(--fallow-chosen);
      background: var(--fallow-wash);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DraftNote {
  readonly discard = output();
}
