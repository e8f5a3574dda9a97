import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';

import {
  decimalMark,
  type ImportLayout,
  importLayout,
  type ImportProposal,
  listDelimiter,
  listEncoding,
} from '../../../../../shared/contracts/list-import';
import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { ImportStore } from '../import-store';
import { delimiterWords, markWords } from '../list-words';

type LayoutName = keyof ImportLayout;

/** How the text of the file is taken apart; what is chosen is seen at once in the sample. */
@Component({
  selector: 'app-layout-fields',
  imports: [MatFormFieldModule, MatInputModule, ProblemNote],
  templateUrl: './layout-fields.html',
  styleUrl: './layout-fields.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LayoutFields {
  private readonly list = inject(ImportStore);

  readonly proposal = input.required<ImportProposal>();

  protected readonly isBusy = signal(false);
  protected readonly refusal = signal<Problem | null>(null);
  protected readonly fields = computed(() => {
    const { encoding, delimiter, decimalMark: mark } = this.proposal();
    return [
      {
        name: 'encoding' as const,
        words: $localize`Encoding`,
        options: optionsOf(listEncoding.options, encoding),
      },
      {
        name: 'delimiter' as const,
        words: $localize`Cells parted by`,
        options: optionsOf(listDelimiter.options, delimiter, delimiterWords),
      },
      {
        name: 'decimalMark' as const,
        words: $localize`Decimal mark`,
        options: optionsOf(decimalMark.options, mark, markWords),
      },
    ];
  });

  /** One request a change: what is said again, or while the last one is under way, is not sent. */
  protected async choose(name: LayoutName, select: HTMLSelectElement): Promise<void> {
    if (this.isBusy() || select.value === this.proposal()[name]) return;
    this.isBusy.set(true);
    this.refusal.set(null);
    try {
      const layout: ImportLayout = importLayout.parse({ [name]: select.value });
      await this.list.layOut(layout);
    } catch (error) {
      const problem = toProblem(error);
      this.refusal.set({ ...problem, title: problem.issues?.[0]?.message ?? problem.title });
      // Nothing has changed on the server, so nothing else would show the old choice again.
      select.value = this.proposal()[name];
    } finally {
      this.isBusy.set(false);
    }
  }
}

const optionsOf = (
  values: readonly string[],
  chosen: string,
  words: (value: string) => string = (value) => value,
) => values.map((value) => ({ value, words: words(value), isChosen: value === chosen }));
