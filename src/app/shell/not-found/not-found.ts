import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';

import { Empty } from '../../ui/page-state/empty';

/** An address that leads nowhere. */
@Component({
  selector: 'app-not-found',
  imports: [Empty, RouterLink],
  template: `
    <app-empty i18n-title title="There is no such page">
      <p i18n>
        The address may be mistyped, or what stood here was deleted.
        <a routerLink="/">Go to the first page</a>.
      </p>
    </app-empty>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotFound {}
