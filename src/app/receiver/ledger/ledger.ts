import { Clipboard } from '@angular/cdk/clipboard';
import { ChangeDetectionStrategy, Component, DOCUMENT, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule } from '@angular/material/dialog';

import { Icon } from '../../ui/icon/icon';
import { type LedgerContext, ledgerFacts, ledgerText, ledgerTitle } from './ledger-facts';
import { ledgerLines } from './ledger-words';

/** How a figure came about, term by term. The address it is opened at opens it again. */
@Component({
  selector: 'app-ledger',
  templateUrl: './ledger.html',
  styleUrl: './ledger.scss',
  imports: [Icon, MatButtonModule, MatDialogModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Ledger {
  private readonly clipboard = inject(Clipboard);
  private readonly document = inject(DOCUMENT);
  private readonly context = inject<LedgerContext>(MAT_DIALOG_DATA);

  protected readonly response = this.context.response;
  protected readonly title = ledgerTitle(this.context);
  protected readonly facts = ledgerFacts(this.context);
  protected readonly lines = ledgerLines(this.response);
  protected readonly said = signal('');

  protected copyText(): void {
    const text = ledgerText(this.context, this.lines, this.document.location.href);
    this.say(this.clipboard.copy(text), $localize`The working is copied.`);
  }

  protected copyLink(): void {
    const isDone = this.clipboard.copy(this.document.location.href);
    this.say(isDone, $localize`The link is copied.`);
  }

  private say(isDone: boolean, done: string): void {
    this.said.set(isDone ? done : $localize`This browser does not let the page copy.`);
  }
}
