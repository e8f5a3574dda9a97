import { ChangeDetectionStrategy, Component } from '@angular/core';

import { Icon } from '../../ui/icon/icon';

/** Stands wherever the page tells someone to touch a set. */
@Component({
  selector: 'app-caution',
  imports: [Icon],
  template: `
    <app-icon name="warning" />
    <p i18n>
      Aligning means working inside the set: high tension, and in some sets mains on the chassis.
      Capacitors hold 250–400 V after it is switched off: discharge and measure. Isolation
      transformer, insulated tools, one hand. Follow local codes and licensed practice.
    </p>
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
export class Caution {}
