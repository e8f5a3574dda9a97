import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  LOCALE_ID,
} from '@angular/core';

import type { CorrectionMark } from '../../../../shared/contracts/correction';
import { Icon } from '../../ui/icon/icon';
import { correctionIcons, correctionWords } from '../correction-words';

/** A correction in words: what, by whom, when, and the note. */
@Component({
  selector: 'app-mark-words',
  imports: [Icon],
  template: `
    <app-icon [name]="icon()" /> {{ words() }}
    @if (mark().note) {
      <q>{{ mark().note }}</q>
    }
  `,
  styles: `
    q {
      display: block;
      color: var(--fallow-quiet);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MarkWords {
  private readonly locale = inject(LOCALE_ID);

  readonly mark = input.required<Pick<CorrectionMark, 'kind' | 'date' | 'note' | 'authorName'>>();

  protected readonly icon = computed(() => correctionIcons[this.mark().kind]);
  protected readonly words = computed(() => correctionWords(this.mark(), this.locale));
}
