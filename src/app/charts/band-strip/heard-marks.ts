import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { causeMarks, MARK_AREA } from '../cause-mark';
import { shapesAt } from '../shapes';
import { type BreakthroughCurve, type HeardMark, STRIP } from './strip-layout';

/** What is hidden is drawn smaller. */
const HIDDEN_AREA = 0.3 * MARK_AREA;

/**
 * Responses over the glass, each by its cause: stem and mark when heard, small and faint if not.
 * One path for all of a kind: they are drawn anew while the IF moves.
 */
@Component({
  selector: 'svg:g[appHeardMarks]',
  template: `
    @for (each of breakthroughs(); track each.id) {
      <svg:path class="breakthrough" [attr.d]="each.path" [style.color]="each.colour" />
    }
    @for (kind of kinds(); track kind.key) {
      <svg:g [style.color]="kind.look.colour" [class.hidden]="kind.isHidden">
        @if (!kind.isHidden) {
          <svg:path class="stem" [attr.d]="kind.stems" [attr.stroke-dasharray]="kind.look.dash" />
        }
        <svg:path class="mark" [class.hollow]="kind.look.isHollow" [attr.d]="kind.marks" />
      </svg:g>
    }
  `,
  styleUrl: './heard-marks.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HeardMarks {
  readonly heard = input.required<readonly HeardMark[]>();
  readonly breakthroughs = input.required<readonly BreakthroughCurve[]>();

  /** What is hidden comes first, so that it never covers what is heard. */
  protected readonly kinds = computed(() =>
    [true, false].flatMap((isHidden) =>
      causeMarks.flatMap((look) => {
        const marks = this.heard().filter(
          ({ response }) =>
            response.cause === look.cause && (response.hidden !== null) === isHidden,
        );
        if (marks.length === 0) return [];
        return {
          key: `${look.cause} ${String(isHidden)}`,
          look,
          isHidden,
          stems: marks
            .map(({ x, y }) => `M${x.toFixed(2)},${STRIP.heard}V${(y + 5).toFixed(2)}`)
            .join(''),
          marks: shapesAt(look.shape, isHidden ? HIDDEN_AREA : MARK_AREA, marks),
        };
      }),
    ),
  );
}
