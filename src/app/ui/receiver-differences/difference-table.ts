import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import type { Difference } from './differences';

/** Where two states of a receiver differ, field by field. */
@Component({
  selector: 'app-difference-table',
  template: `
    <div class="scroll" role="region" tabindex="0" [attr.aria-label]="caption()">
      <table>
        <thead>
          <tr>
            <th scope="col" i18n>Field</th>
            <th scope="col">{{ mine() }}</th>
            <th scope="col">{{ theirs() }}</th>
          </tr>
        </thead>
        <tbody>
          @for (each of differences(); track each.field) {
            <tr>
              <th scope="row">{{ each.field }}</th>
              <td>{{ each.mine }}</td>
              <td>{{ each.theirs }}</td>
            </tr>
          } @empty {
            <tr>
              <td colspan="3">{{ none() }}</td>
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
      border-collapse: collapse;
    }

    th,
    td {
      padding: 0.35rem 1.5rem 0.35rem 0;
      border-block-end: 1px solid var(--fallow-hairline);
      font-weight: 400;
      text-align: start;
    }

    thead th {
      font-weight: 500;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DifferenceTable {
  readonly differences = input.required<readonly Difference[]>();
  /** What the table shows, for those who do not see it. */
  readonly caption = input.required<string>();
  /** Heads of the two states. */
  readonly mine = input.required<string>();
  readonly theirs = input.required<string>();
  /** Said where nothing differs. */
  readonly none = input('');
}
