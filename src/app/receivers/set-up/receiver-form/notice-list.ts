import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { Icon } from '../../../ui/icon/icon';
import type { Notice } from './notices';

/** What stands out in the set-up while it is typed. */
@Component({
  selector: 'app-notice-list',
  imports: [Icon],
  template: `
    <div role="status">
      <ul>
        @for (notice of notices(); track notice.text) {
          <li [class]="notice.kind">
            <app-icon [name]="notice.kind === 'error' ? 'warning' : 'info'" />
            {{ notice.text }}
          </li>
        }
      </ul>
    </div>
  `,
  styles: `
    ul {
      display: grid;
      gap: 0.75rem;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      display: flex;
      gap: 0.5rem;
      max-width: 68ch;
    }
    app-icon {
      margin-block-start: 0.15em;
      color: var(--fallow-chosen);
    }
    .error {
      color: var(--fallow-alarm);
    }
    .error app-icon {
      color: inherit;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NoticeList {
  readonly notices = input.required<readonly Notice[]>();
}
