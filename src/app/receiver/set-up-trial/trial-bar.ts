import { ChangeDetectionStrategy, Component, computed, inject, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatSnackBar } from '@angular/material/snack-bar';

import { Icon } from '../../ui/icon/icon';
import { DifferenceTable } from '../../ui/receiver-differences/difference-table';
import { SetUpTrial } from './set-up-trial';
import { TrialRefused } from './trial-refused';

const SAID_MS = 4000;

const nothingTo = (isRedo: boolean): string =>
  isRedo ? $localize`There is nothing to redo.` : $localize`There is nothing to undo.`;

/** What is on trial, on every section of the receiver: undone, redone, taken over, kept, dropped. */
@Component({
  selector: 'app-trial-bar',
  templateUrl: './trial-bar.html',
  styleUrl: './trial-bar.scss',
  imports: [DifferenceTable, Icon, MatButtonModule, TrialRefused],
  host: { '(document:keydown)': 'followKeys($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialBar {
  private readonly snackBar = inject(MatSnackBar);
  protected readonly trial = inject(SetUpTrial);

  /** Asks to keep what is on trial as a plan. */
  readonly keep = output();

  protected readonly isShown = computed(
    () =>
      this.trial.isChanged() || this.trial.canUndo() || this.trial.canRedo() || this.trial.isLost(),
  );
  /** Ctrl+Z and Ctrl+Shift+Z, but not where somebody is typing: there they belong to the text. */
  protected followKeys(event: KeyboardEvent): void {
    const isTyping = event.target instanceof HTMLElement && event.target.matches('input, textarea');
    if (event.key.toLowerCase() !== 'z' || !(event.ctrlKey || event.metaKey) || isTyping) return;
    event.preventDefault();
    void this.step(event.shiftKey);
  }

  /** The bar may be out of sight: what a key did is said where it can be seen. */
  private async step(isRedo: boolean): Promise<void> {
    const isPossible = isRedo ? this.trial.canRedo() : this.trial.canUndo();
    await (isRedo ? this.trial.redo() : this.trial.undo());
    this.snackBar.open(isPossible ? this.done(isRedo) : nothingTo(isRedo), undefined, {
      duration: SAID_MS,
    });
  }

  private done(isRedo: boolean): string {
    const what = isRedo ? $localize`Redone.` : $localize`Undone.`;
    const count = this.trial.differences().length;
    return count === 0
      ? $localize`${what}:what: The set-up is as saved.`
      : $localize`${what}:what: Fields of the set-up on trial: ${count}:count:.`;
  }
}
