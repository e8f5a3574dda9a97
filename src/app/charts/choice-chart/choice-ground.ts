import { ChangeDetectionStrategy, Component, input } from '@angular/core';

import { type Frame } from '../frame';

/** A stretch of the frequency axis in CSS pixels. */
export interface DrawnStretch {
  readonly x: number;
  readonly width: number;
}

/** What the stations stand before: guard bands, what is out of reach, raster, noise, passband. */
@Component({
  selector: 'svg:g[appChoiceGround]',
  templateUrl: './choice-ground.html',
  styleUrl: './choice-ground.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoiceGround {
  readonly frame = input.required<Frame>();
  readonly guards = input.required<readonly DrawnStretch[]>();
  /** Where the IF cannot be moved to. */
  readonly beyond = input.required<readonly DrawnStretch[]>();
  /** Where the choice holds. */
  readonly holding = input.required<DrawnStretch | null>();
  readonly channels = input.required<readonly number[]>();
  readonly noise = input.required<{ readonly y: number; readonly text: string } | null>();
  /** Path of the passband's curve. */
  readonly passband = input.required<string>();
}
