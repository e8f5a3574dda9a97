import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { type CauseMark } from './cause-mark';

/** The mark of a cause beside its words. Silent: the words say it. */
@Component({
  selector: 'app-cause-sign',
  template: `
    <svg viewBox="-7 -7 14 14" aria-hidden="true" [style.color]="look().colour">
      <path [attr.d]="look().path" [class.hollow]="look().isHollow" />
    </svg>
  `,
  styles: `
    svg {
      width: 14px;
      height: 14px;
      vertical-align: -2px;
    }

    path {
      fill: currentColor;
      stroke: currentColor;
      stroke-width: 1.5;
    }

    .hollow {
      fill: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CauseSign {
  readonly look = input.required<CauseMark>();
}
