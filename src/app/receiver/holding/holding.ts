import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { Candidate } from '../../../../shared/contracts/candidates';
import type { Receiver } from '../../../../shared/radio/receiver';
import { holdingSentence, movesWith } from './holding-words';

/** How exactly the IF on trial must be kept, and what else moves with it. */
@Component({
  selector: 'app-holding',
  template: `
    <p>{{ sentence() }}</p>
    @if (isMoved()) {
      <dl>
        @for (each of moves(); track each.what) {
          <div>
            <dt>{{ each.what }}</dt>
            <dd>{{ each.how }}</dd>
          </div>
        }
      </dl>
    }
  `,
  styles: `
    :host {
      display: block;
    }
    dl {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 28px;
      margin: 6px 0 0;
      font-size: 0.9375rem;
    }
    div {
      display: flex;
      gap: 8px;
    }
    dt {
      color: var(--fallow-quiet);
    }
    dd {
      margin: 0;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Holding {
  readonly candidate = input.required<Candidate>();
  readonly receiver = input.required<Pick<Receiver, 'ifHz' | 'bfo'>>();

  protected readonly sentence = computed(() => holdingSentence(this.candidate()));
  protected readonly isMoved = computed(() => this.candidate().ifHz !== this.receiver().ifHz);
  protected readonly moves = computed(() => {
    const { bfo } = this.receiver();
    return movesWith({ ...this.candidate(), ...(bfo ? {} : { bfoShiftHz: null }) });
  });
}
