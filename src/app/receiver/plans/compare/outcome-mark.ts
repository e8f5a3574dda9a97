import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { Outcome } from './comparison';

const looks: Readonly<Record<Outcome, { readonly mark: string; readonly word: string }>> = {
  better: { mark: '▲', word: $localize`better` },
  worse: { mark: '▼', word: $localize`worse` },
  same: { mark: '=', word: $localize`same` },
  differs: { mark: '≠', word: $localize`differs` },
};

/** Better, worse, same or other: a mark and a word, told apart without colour. */
@Component({
  selector: 'app-outcome-mark',
  template: `<span aria-hidden="true">{{ look().mark }}</span> {{ look().word }}`,
  styles: `
    :host {
      white-space: nowrap;
    }

    :host(.better),
    :host(.worse) {
      font-weight: 500;
    }

    :host(.same) {
      color: var(--fallow-quiet);
    }
  `,
  host: { '[class]': 'outcome()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OutcomeMark {
  readonly outcome = input.required<Outcome>();

  protected readonly look = computed(() => looks[this.outcome()]);
}
