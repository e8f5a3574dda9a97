import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';

/** What is asked; the buttons say what they do. */
export interface Question {
  readonly title: string;
  readonly text: string;
  readonly agree: string;
  readonly decline: string;
}

/** A question with two answers. */
@Component({
  selector: 'app-confirm-dialog',
  imports: [MatButtonModule, MatDialogModule],
  template: `
    <h2 mat-dialog-title>{{ question.title }}</h2>
    <mat-dialog-content>
      <p>{{ question.text }}</p>
    </mat-dialog-content>
    <mat-dialog-actions>
      <button mat-button type="button" [mat-dialog-close]="false" cdkFocusInitial>
        {{ question.decline }}
      </button>
      <button mat-flat-button type="button" [mat-dialog-close]="true">{{ question.agree }}</button>
    </mat-dialog-actions>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ConfirmDialog {
  protected readonly question = inject<Question>(MAT_DIALOG_DATA);
}
