import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { type DrawnCurve } from './curve-layout';

/** Curves with their marks. */
@Component({
  selector: 'svg:g[appCurveMarks]',
  template: `
    @for (curve of curves(); track curve.id) {
      <svg:g [style.color]="curve.look.colour">
        <svg:path class="line" [attr.d]="curve.path" [attr.stroke-dasharray]="curve.look.dash" />
        @for (mark of curve.marks; track $index) {
          <svg:path
            class="mark"
            [attr.transform]="'translate(' + mark.x + ',' + mark.y + ')'"
            [attr.d]="curve.look.path"
          />
        }
      </svg:g>
    }
  `,
  styles: `
    .line {
      fill: none;
      stroke: currentColor;
      stroke-width: 1.75;
      stroke-linejoin: round;
    }

    .mark {
      fill: var(--fallow-ground);
      stroke: currentColor;
      stroke-width: 1.5;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CurveMarks {
  readonly curves = input.required<readonly DrawnCurve[]>();
}
