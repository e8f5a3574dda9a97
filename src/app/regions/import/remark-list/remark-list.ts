import { DecimalPipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import type { ImportRemark } from '../../../../../shared/contracts/list-import';

/** What was done with rows that are not rejected, where it does not go without saying. */
@Component({
  selector: 'app-remark-list',
  imports: [DecimalPipe],
  template: `
    @if (remarks().length > 0) {
      <ul>
        @for (remark of remarks(); track remark.message) {
          <li>
            {{ remark.message }}
            <span class="quiet" i18n>
              {remark.count, plural, =1 {Line} other {{{ remark.count | number }} rows; lines}}
              {{ remark.lines.join(', ') }}{{ remark.count > remark.lines.length ? ' …' : '.' }}
            </span>
          </li>
        }
      </ul>
    }
  `,
  styleUrl: './remark-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RemarkList {
  readonly remarks = input.required<readonly ImportRemark[]>();
}
