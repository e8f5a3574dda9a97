import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { type Stem } from './choice-layout';

/** Stations as stems: thin up to their field, thick up to what the passband lets through. */
@Component({
  selector: 'svg:g[appChoiceStems]',
  template: `
    @for (stem of stems(); track stem.id) {
      <svg:line
        class="stem"
        [attr.x1]="stem.x"
        [attr.x2]="stem.x"
        [attr.y1]="stem.y"
        [attr.y2]="foot()"
      />
      <svg:line
        class="passed"
        [attr.x1]="stem.x"
        [attr.x2]="stem.x"
        [attr.y1]="stem.passedY"
        [attr.y2]="foot()"
      />
      <svg:circle r="3.5" [attr.cx]="stem.x" [attr.cy]="stem.y" />
    }
  `,
  styles: `
    .stem {
      stroke: var(--fallow-edge);
    }

    .passed {
      stroke: var(--fallow-ink);
      stroke-width: 3;
    }

    circle {
      fill: var(--fallow-ground);
      stroke: var(--fallow-ink);
      stroke-width: 1.5;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoiceStems {
  readonly stems = input.required<readonly Stem[]>();
  /** Where the stems stand, CSS pixels. */
  readonly foot = input.required<number>();
}
