import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import type { ScaleContinuousNumeric } from 'd3';

import { LevelAxis } from '../axis/level-axis';
import { Chart } from '../chart/chart';
import { type Frame } from '../frame';
import { Plot } from '../plot/plot';
import { PlotLabels } from '../plot/plot-labels';
import { type Readout } from '../plot/plot-mark';
import { tenths } from '../readings';
import { type Window } from '../zoom-window';
import { type Curve, curveLook } from './curve';
import { curveLabels, drawnCurves, levelsAt, levelsOf, placesAlong } from './curve-layout';
import { CurveMarks } from './curve-marks';

/** A place along a chart that is named. */
export interface Rule {
  readonly at: number;
  readonly text: string;
}

const NOTHING = '\u2013';

/**
 * What charts of curves have in common; pages use `app-line-chart` and `app-day-strip`. The axis
 * along the foot is given as content.
 */
@Component({
  selector: 'app-curve-chart',
  templateUrl: './curve-chart.html',
  styleUrl: './curve-chart.scss',
  imports: [Chart, CurveMarks, LevelAxis, Plot, PlotLabels],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CurveChart {
  readonly heading = input.required<string>();
  readonly description = input.required<string>();
  readonly curves = input.required<readonly Curve[]>();
  readonly frame = input.required<Frame>();
  /** From a place to pixels over the whole range, and over what is shown. */
  readonly wholeScale = input.required<ScaleContinuousNumeric<number, number>>();
  readonly scale = input.required<ScaleContinuousNumeric<number, number>>();
  readonly canZoom = input(false);
  /** What stands along, and a place in words, with its unit and without. */
  readonly alongLabel = input.required<string>();
  readonly writeAlong = input.required<(at: number) => string>();
  readonly sayAlong = input.required<(at: number) => string>();
  readonly levelLabel = input.required<string>();
  readonly levelUnit = input.required<string>();
  readonly rules = input<readonly Rule[]>([]);
  /** Stretches along the chart that are shaded. */
  readonly shaded = input<readonly Window[]>([]);
  readonly leadsOn = input('');
  readonly window = model<Window | null>(null);
  readonly picked = model<string | null>(null);
  readonly entered = output<number>();

  private readonly shown = computed<Window>(() => {
    const [low = 0, high = 1] = this.scale().domain();
    return [low, high];
  });
  private readonly places = computed(() => placesAlong(this.curves()));
  private readonly levels = computed(() => levelsAt(this.curves()));
  protected readonly y = computed(() => levelsOf(this.curves(), this.frame().innerHeight));
  protected readonly drawn = computed(() =>
    drawnCurves(this.curves(), this.scale(), this.y(), this.shown()),
  );
  protected readonly labels = computed(() =>
    curveLabels(this.curves(), this.drawn(), this.scale(), this.y(), this.frame().innerWidth),
  );
  /** Curves whose names found no room beside them. */
  protected readonly unnamed = computed(() => {
    const named = new Set(this.labels().map(({ id }) => id));
    return this.curves()
      .map(({ id, name }, index) => ({ id, name, look: curveLook(index) }))
      .filter(({ id }) => !named.has(id));
  });
  protected readonly marks = computed(() => {
    const [low, high] = this.shown();
    return this.places()
      .filter((at) => at >= low && at <= high)
      .map((at) => {
        const level = this.levels()(at).find((each) => each !== null);
        return { id: String(at), x: this.scale()(at), y: this.y()(level ?? 0) };
      });
  });
  protected readonly order = computed(() =>
    this.places().map((at) => ({ id: String(at), value: at })),
  );
  protected readonly rulesShown = computed(() => {
    const [low, high] = this.shown();
    return this.rules()
      .filter(({ at }) => at >= low && at <= high)
      .map((rule) => ({ ...rule, x: this.scale()(rule.at) }));
  });
  protected readonly shades = computed(() =>
    this.shaded().map(([low, high]) => {
      const x = this.scale()(low);
      return { x, width: Math.max(0, this.scale()(high) - x) };
    }),
  );

  protected readonly table = () => ({
    columns: [
      this.alongLabel(),
      ...this.curves().map(({ name }) => `${name}, ${this.levelUnit()}`),
    ],
    rows: this.places().map((at) => ({
      id: String(at),
      cells: [
        this.writeAlong()(at),
        ...this.levels()(at).map((level) => (level === null ? NOTHING : tenths(level))),
      ],
    })),
  });

  protected readonly describe = (id: string): Readout => {
    const at = Number(id);
    const levels = this.levels()(at);
    return {
      title: this.sayAlong()(at),
      lines: this.curves().flatMap(({ name }, index) => {
        const level = levels[index] ?? null;
        return level === null ? [] : { label: name, value: `${tenths(level)} ${this.levelUnit()}` };
      }),
    };
  };
}
