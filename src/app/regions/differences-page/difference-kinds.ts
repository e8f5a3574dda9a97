import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';

import type {
  DifferenceKind,
  DifferencesAnswer,
} from '../../../../shared/contracts/edition-differences';
import { DIFFERENCE_KINDS, kindWords } from './difference-words';

/** How many differences there are of each kind; each leads to its own. */
@Component({
  selector: 'app-difference-kinds',
  imports: [RouterLink],
  templateUrl: './difference-kinds.html',
  styleUrl: './difference-kinds.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DifferenceKinds {
  readonly answer = input.required<DifferencesAnswer>();
  /** The kind that is shown alone; undefined: all. */
  readonly shown = input<DifferenceKind>();

  protected readonly kinds = computed(() =>
    DIFFERENCE_KINDS.map((kind) => ({
      kind,
      words: kindWords(kind),
      count: this.answer().counts[kind],
    })),
  );
}
