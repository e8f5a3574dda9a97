import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { type BreakthroughCurve, type HeardMark, STRIP } from './strip-layout';

/** Responses over the glass, each by its cause: stem and mark when heard, small and faint if not. */
@Component({
  selector: 'svg:g[appHeardMarks]',
  template: `
    @for (each of breakthroughs(); track each.id) {
      <svg:path class="breakthrough" [attr.d]="each.path" [style.color]="each.colour" />
    }
    @for (mark of heard(); track mark.id) {
      <svg:g
        [attr.transform]="'translate(' + mark.x + ',' + mark.y + ')'"
        [style.color]="mark.look.colour"
        [class.hidden]="mark.response.hidden"
      >
        @if (!mark.response.hidden) {
          <svg:line
            class="stem"
            y1="5"
            [attr.y2]="foot - mark.y"
            [attr.stroke-dasharray]="mark.look.dash"
          />
        }
        <svg:path
          class="mark"
          [class.hollow]="mark.look.isHollow"
          [attr.transform]="mark.response.hidden ? 'scale(0.55)' : null"
          [attr.d]="mark.look.path"
        />
      </svg:g>
    }
  `,
  styleUrl: './heard-marks.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HeardMarks {
  readonly heard = input.required<readonly HeardMark[]>();
  readonly breakthroughs = input.required<readonly BreakthroughCurve[]>();

  protected readonly foot = STRIP.heard;
}
