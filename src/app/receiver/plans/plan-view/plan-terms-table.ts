import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { ReadablePlan } from '../../../../../shared/contracts/plan';
import type { Period } from '../../../../../shared/radio/site';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import { planTerms } from '../plan-terms';

/** Every term of the present and the chosen IF for a period. */
@Component({
  selector: 'app-plan-terms-table',
  template: `
    <div class="scroll" role="region" tabindex="0" i18n-aria-label aria-label="Every term">
      <table>
        <thead>
          <tr>
            <th scope="col" i18n>Term</th>
            <th scope="col">{{ plan().receiver.ifHz | frequency }}</th>
            <th scope="col">{{ plan().ifHz | frequency }}</th>
          </tr>
        </thead>
        <tbody>
          @for (term of terms(); track term.label) {
            <tr>
              <th scope="row">{{ term.label }}</th>
              <td>{{ term.present }}</td>
              <td>{{ term.chosen }}</td>
            </tr>
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    .scroll {
      overflow-x: auto;
    }

    table {
      width: 100%;
      max-width: 48rem;
      border-collapse: collapse;
    }

    th,
    td {
      padding: 6px 16px 6px 0;
      border-bottom: 1px solid var(--fallow-hairline);
      font-weight: 400;
      text-align: left;
    }

    td,
    thead th + th {
      padding-right: 0;
      text-align: right;
    }

    thead th {
      color: var(--fallow-quiet);
    }
  `,
  imports: [FrequencyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanTermsTable {
  readonly plan = input.required<ReadablePlan>();
  readonly period = input.required<Period>();

  protected readonly terms = computed(() => planTerms(this.plan(), this.period()));
}
