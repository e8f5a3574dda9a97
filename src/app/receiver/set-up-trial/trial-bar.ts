import { ChangeDetectionStrategy, Component, computed, inject, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { Icon } from '../../ui/icon/icon';
import { DifferenceTable } from '../../ui/receiver-differences/difference-table';
import { SetUpTrial } from './set-up-trial';
import { TrialRefused } from './trial-refused';

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
    void (event.shiftKey ? this.trial.redo() : this.trial.undo());
  }
}
