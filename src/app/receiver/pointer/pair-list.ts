import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';

import { TrialStore } from '../trial/trial-store';
import { type Beat, beatOrigin } from './beat-words';
import { pairsSummary } from './silent-pairs';

/** The pairs of stations that make the IF between them: one line, which opens to their names. */
@Component({
  selector: 'app-pair-list',
  template: `
    @if (pairs().length > 0) {
      <details>
        <summary>{{ summary() }}</summary>
        <ul>
          @for (name of names(); track $index) {
            <li>{{ name }}</li>
          }
        </ul>
      </details>
    }
  `,
  styles: `
    summary {
      min-height: 28px;
      color: var(--fallow-quiet);
      cursor: pointer;
    }

    ul {
      margin: 0;
      padding-inline-start: 1.25rem;
      columns: 20rem;
      column-gap: 32px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PairList {
  private readonly trial = inject(TrialStore);

  readonly pairs = input.required<readonly Beat[]>();

  protected readonly summary = computed(() => pairsSummary(this.pairs().length));
  protected readonly names = computed(() =>
    this.pairs().map((each) => beatOrigin(each, this.trial.nameOf)),
  );
}
