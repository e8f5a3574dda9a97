import { ChangeDetectionStrategy, Component } from '@angular/core';

import { CAUTION } from '../../../../shared/radio/caution';
import { Icon } from '../../ui/icon/icon';

/** Stands wherever the page tells someone to touch a set. */
@Component({
  selector: 'app-caution',
  imports: [Icon],
  template: `
    <app-icon name="warning" />
    <p>{{ caution }}</p>
  `,
  styles: `
    :host {
      display: flex;
      gap: 8px;
      color: var(--fallow-quiet);
      font-size: 0.875rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Caution {
  protected readonly caution = CAUTION;
}
