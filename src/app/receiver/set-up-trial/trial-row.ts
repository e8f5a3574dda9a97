import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';

import type { ReceiverDraft } from '../../../../shared/contracts/receiver';
import { quantities } from '../../ui/quantity/quantity';
import { choiceWord } from './choice-word';
import { fieldText, setField } from './set-field';
import type { TrialField } from './trial-fields';

/** A field: as saved, and on trial; that they differ is said in a word and by a mark. */
@Component({
  selector: 'tr[appTrialRow]',
  templateUrl: './trial-row.html',
  styleUrl: './trial-row.scss',
  host: { '[class.changed]': 'isChanged()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialRow {
  readonly field = input.required<TrialField>();
  readonly saved = input.required<ReceiverDraft>();
  readonly onTrial = input.required<ReceiverDraft>();
  /** The receiver with the field set as typed. */
  readonly tried = output<ReceiverDraft>();

  protected readonly problem = signal('');
  protected readonly choiceWord = choiceWord;
  protected readonly before = computed(() => fieldText(this.saved(), this.field()));
  protected readonly now = computed(() => fieldText(this.onTrial(), this.field()));
  protected readonly isChanged = computed(() => this.before() !== this.now());
  protected readonly unit = computed(() => {
    const { entry } = this.field();
    return entry.kind === 'quantity' ? quantities[entry.quantity].unit : '';
  });
  protected readonly options = computed(() => {
    const { entry } = this.field();
    return entry.kind === 'choice' ? entry.options : [];
  });
  protected readonly problemId = computed(
    () => `trial-problem-${this.field().path.replaceAll('.', '-')}`,
  );

  protected set(typed: string): void {
    if (typed === this.now()) {
      this.problem.set('');
      return;
    }
    const changed = setField(this.onTrial(), this.field(), typed);
    this.problem.set('problem' in changed ? changed.problem : '');
    if ('receiver' in changed) this.tried.emit(changed.receiver);
  }
}
