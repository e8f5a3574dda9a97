import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { type PlacedLabel } from '../place-labels';

/** Names of marks, where they found room. */
@Component({
  selector: 'svg:g[appPlotLabels]',
  template: `
    @for (label of labels(); track label.id) {
      <svg:text dy="0.32em" [attr.x]="label.x" [attr.y]="label.y">{{ label.text }}</svg:text>
    }
  `,
  styles: `
    text {
      fill: var(--fallow-ink);
      font-size: 12px;
      text-anchor: middle;
      paint-order: stroke;
      stroke: var(--fallow-ground);
      stroke-width: 3px;
      stroke-linejoin: round;
      pointer-events: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlotLabels {
  readonly labels = input.required<readonly PlacedLabel[]>();
}
