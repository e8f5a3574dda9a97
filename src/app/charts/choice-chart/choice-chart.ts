import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import { scaleLinear } from 'd3';

import { formatFrequency } from '../../ui/frequency-pipe';
import { FrequencyAxis } from '../axis/frequency-axis';
import { LevelAxis } from '../axis/level-axis';
import { Chart } from '../chart/chart';
import { frame, NARROW } from '../frame';
import { observeWidth } from '../observe-width';
import { Plot } from '../plot/plot';
import { PlotLabels } from '../plot/plot-labels';
import { type Readout } from '../plot/plot-mark';
import { distance, field, kilohertz, kilometres, tenths } from '../readings';
import { type Window } from '../zoom-window';
import { ChoiceGround, type DrawnStretch } from './choice-ground';
import {
  type HeardStation,
  levelScale,
  passbandPath,
  type StationAtSite,
  stationMark,
  stemLabels,
  stems,
  thinned,
} from './choice-layout';
import { ChoiceStems } from './choice-stems';
import { IfMarker } from './if-marker';

const FIELD_HEIGHT = 300;

/** A stretch of frequencies, hertz. */
export interface Stretch {
  readonly low: number;
  readonly high: number;
}

/** Stations around the IF at their field, the raster, and the passband at the IF on trial. */
@Component({
  selector: 'app-choice-chart',
  templateUrl: './choice-chart.html',
  styleUrl: './choice-chart.scss',
  imports: [Chart, ChoiceGround, ChoiceStems, FrequencyAxis, IfMarker, LevelAxis, Plot, PlotLabels],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoiceChart {
  readonly stations = input.required<readonly StationAtSite[]>();
  /** What the chart can show at most. */
  readonly range = input.required<Stretch>();
  /** How far the IF can be moved. */
  readonly reach = input.required<Stretch>();
  readonly presentHz = input.required<number>();
  readonly trialHz = model.required<number>();
  /** Window around the IF on trial within which the choice holds. */
  readonly holds = input<Stretch | null>(null);
  readonly channels = input<readonly number[]>([]);
  readonly guards = input<readonly Stretch[]>([]);
  readonly noiseDb = input<number | null>(null);
  /** Rejection of the IF amplifier against the offset from its centre, decibels. */
  readonly rejection = input.required<(offsetHz: number) => number>();
  readonly description = input.required<string>();
  readonly window = model<Window | null>(null);
  readonly picked = model<string | null>(null);
  /** The marker was let go. */
  readonly settled = output();

  private readonly width = observeWidth();
  protected readonly isNarrow = computed(() => this.width() < NARROW);
  protected readonly frame = computed(() =>
    frame(this.width(), FIELD_HEIGHT + 104, {
      top: 58,
      right: this.isNarrow() ? 8 : 16,
      bottom: 46,
      left: this.isNarrow() ? 36 : 48,
    }),
  );
  protected readonly wholeScale = computed(() =>
    scaleLinear([this.range().low, this.range().high], [0, this.frame().innerWidth]),
  );
  protected readonly shown = computed<Window>(
    () => this.window() ?? [this.range().low, this.range().high],
  );
  protected readonly x = computed(() =>
    scaleLinear([...this.shown()], [0, this.frame().innerWidth]),
  );
  private readonly heard = computed(() => {
    const { low, high } = this.range();
    return this.stations().filter(
      (station): station is HeardStation =>
        station.fieldDb !== null && station.frequencyHz >= low && station.frequencyHz <= high,
    );
  });
  protected readonly y = computed(() =>
    levelScale(this.heard(), this.noiseDb(), this.frame().innerHeight),
  );
  protected readonly stems = computed(() =>
    stems(this.heard(), this.x(), this.y(), this.rejection(), this.trialHz()),
  );
  protected readonly drawn = computed(() => thinned(this.stems()));
  protected readonly labels = computed(() =>
    stemLabels(this.drawn(), this.frame().innerWidth, this.isNarrow()),
  );
  protected readonly passband = computed(() =>
    passbandPath(this.shown(), this.x(), this.y(), this.rejection(), this.trialHz()),
  );
  protected readonly order = computed(() =>
    this.heard().map(({ id, frequencyHz }) => ({ id: stationMark(id), value: frequencyHz })),
  );
  protected readonly bands = computed(() => this.guards().map((each) => this.stretch(each)));
  protected readonly rasterTicks = computed(() =>
    this.channels()
      .filter((hz) => this.isShown(hz))
      .map((hz) => this.x()(hz)),
  );
  protected readonly beyond = computed(() => {
    const [low, high] = this.shown();
    const reach = this.reach();
    return [
      { low: Math.min(low, reach.low), high: reach.low },
      { low: reach.high, high: Math.max(high, reach.high) },
    ].map((each) => this.stretch(each));
  });
  protected readonly holding = computed(() => {
    const holds = this.holds();
    return holds ? this.stretch(holds) : null;
  });
  protected readonly present = computed(() => ({
    x: this.x()(this.presentHz()),
    isShown: this.isShown(this.presentHz()) && this.presentHz() !== this.trialHz(),
    text: $localize`now ${kilohertz(this.presentHz())}:frequency:`,
  }));
  protected readonly trial = computed(() => ({
    x: this.x()(this.trialHz()),
    isShown: this.isShown(this.trialHz()),
    // The marker covers this on the page; a saved picture has no marker.
    text: kilohertz(this.trialHz()),
  }));
  protected readonly axisLabel = $localize`kHz`;
  protected readonly levelLabel = $localize`field at the site, dB(µV/m)`;
  protected readonly heading = $localize`Around the IF`;
  protected readonly noiseText = computed(() => {
    const noise = this.noiseDb();
    return noise === null
      ? null
      : { y: this.y()(noise), text: $localize`noise ${tenths(noise)}:level:` };
  });

  private readonly columns = [
    $localize`Station`,
    $localize`Frequency, kHz`,
    $localize`Field, dB(µV/m)`,
    $localize`Through the passband, dB(µV/m)`,
    $localize`Distance, km`,
  ];
  private readonly rows = computed(() =>
    this.heard().map((station) => ({
      id: stationMark(station.id),
      cells: [
        station.name,
        kilohertz(station.frequencyHz),
        tenths(station.fieldDb),
        tenths(station.fieldDb - this.rejection()(station.frequencyHz - this.trialHz())),
        kilometres(station.distanceM),
      ],
    })),
  );

  protected readonly table = () => ({ columns: this.columns, rows: this.rows() });

  protected readonly describe = (id: string): Readout | undefined => {
    const station = this.heard().find((each) => stationMark(each.id) === id);
    if (!station) return undefined;
    const offset = station.frequencyHz - this.trialHz();
    const rejected = this.rejection()(offset);
    return {
      title: `${station.name}, ${formatFrequency(station.frequencyHz)}`,
      lines: [
        { label: $localize`Field`, value: field(station.fieldDb) },
        {
          label: $localize`From the IF on trial`,
          value: $localize`${kilohertz(offset)}:offset: kHz`,
        },
        { label: $localize`IF selectivity takes`, value: $localize`${tenths(rejected)}:level: dB` },
        { label: $localize`Distance`, value: distance(station.distanceM) },
      ],
    };
  };

  private isShown(hz: number): boolean {
    const [low, high] = this.shown();
    return hz >= low && hz <= high;
  }

  private stretch({ low, high }: Stretch): DrawnStretch {
    const width = this.frame().innerWidth;
    const from = Math.min(Math.max(this.x()(low), 0), width);
    const to = Math.min(Math.max(this.x()(high), 0), width);
    return { x: from, width: Math.max(0, to - from) };
  }
}
