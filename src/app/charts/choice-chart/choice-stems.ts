import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { symbolCircle } from 'd3';

import { shapesAt } from '../shapes';
import { type Stem } from './choice-layout';

const HEAD_AREA = 38;

/**
 * Stations as stems: thin up to their field, thick up to what the passband lets through. One path
 * for all of a kind: thousands are drawn anew while the marker moves.
 */
@Component({
  selector: 'svg:g[appChoiceStems]',
  template: `
    <svg:path class="stem" [attr.d]="whole()" />
    <svg:path class="passed" [attr.d]="passed()" />
    <svg:path class="head" [attr.d]="heads()" />
  `,
  styles: `
    .stem {
      stroke: var(--fallow-edge);
    }

    .passed {
      stroke: var(--fallow-ink);
      stroke-width: 3;
    }

    .head {
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

  protected readonly whole = computed(() => this.upTo(({ y }) => y));
  protected readonly passed = computed(() => this.upTo(({ passedY }) => passedY));
  protected readonly heads = computed(() => shapesAt(symbolCircle, HEAD_AREA, this.stems()));

  private upTo(top: (stem: Stem) => number): string {
    const foot = this.foot();
    return this.stems()
      .map((stem) => `M${stem.x.toFixed(2)},${foot}V${top(stem).toFixed(2)}`)
      .join('');
  }
}
