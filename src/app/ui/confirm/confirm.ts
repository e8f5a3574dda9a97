import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';

import { ConfirmDialog, type Question } from './confirm-dialog';

/** Asks before something that cannot be taken back. */
@Injectable({ providedIn: 'root' })
export class Confirm {
  private readonly dialog = inject(MatDialog);

  /** Resolves to whether the user agreed. */
  async ask(question: Question): Promise<boolean> {
    const opened = this.dialog.open<ConfirmDialog, Question, boolean>(ConfirmDialog, {
      data: question,
      role: 'alertdialog',
      maxWidth: '32rem',
    });
    return (await firstValueFrom(opened.afterClosed())) === true;
  }
}
