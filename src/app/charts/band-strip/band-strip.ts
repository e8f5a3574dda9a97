import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import { type ScaleLinear } from 'd3';

import { Chart } from '../chart/chart';
import { type StationAtSite } from '../choice-chart/choice-layout';
import { frame, NARROW } from '../frame';
import { observeWidth } from '../observe-width';
import { Plot } from '../plot/plot';
import { type PlotMark } from '../plot/plot-mark';
import { PlotLabels } from '../plot/plot-labels';
import { RangeBars } from '../range-bars/range-bars';
import { bandUnit } from '../readings';
import { type Window } from '../zoom-window';
import { DialGlass } from './dial-glass';
import { DialPointer } from './dial-pointer';
import { HeardMarks } from './heard-marks';
import {
  breakthroughCurves,
  dialScale,
  harmonicLabels,
  heardMarks,
  type JudgedBand,
  responseMark,
  STRIP,
  STRIP_HEIGHT,
  type StripHarmonic,
  stripLabels,
  wantedMarks,
} from './strip-layout';
import { stripColumns, stripReadout, stripRows, stripSentence } from './strip-words';

/** One band as a strip like a dial glass: what is heard over it, the scale, the stations under it. */
@Component({
  selector: 'app-band-strip',
  templateUrl: './band-strip.html',
  styleUrl: './band-strip.scss',
  imports: [Chart, DialGlass, DialPointer, HeardMarks, Plot, PlotLabels, RangeBars],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class BandStrip {
  readonly band = input.required<JudgedBand>();
  /** The band's own range, hertz. */
  readonly range = input.required<{ readonly low: number; readonly high: number }>();
  readonly stations = input.required<readonly StationAtSite[]>();
  /** Noise at a frequency, dB(µV/m); null: not known. */
  readonly noise = input.required<(hz: number) => number | null>();
  /** Levels over the noise, the same for every band of the receiver. */
  readonly loudness = input.required<ScaleLinear<number, number>>();
  readonly isLog = input(false);
  /** Harmonics of the beat oscillator on the band. */
  readonly beatHarmonics = input<readonly { harmonic: number; dialHz: number }[]>([]);
  /** Where the pointer stands, hertz; null: there is none. */
  readonly pointerHz = model<number | null>(null);
  /** The pointer was let go. */
  readonly pointerSettled = output();
  /** What Enter does with a response, in words; empty where nobody listens to `working`. */
  readonly leadsOn = input($localize`Enter shows the working.`);
  /** What of the band is shown; null: the whole of it. */
  readonly window = model<Window | null>(null);
  readonly picked = model<string | null>(null);
  /** The band is being judged anew: said instead of the old figures. */
  readonly awaited = input<string | null>(null);
  /** Asks for the working behind a response. */
  readonly working = output<string>();

  private readonly width = observeWidth();
  protected readonly strip = STRIP;
  private readonly isNarrow = computed(() => this.width() < NARROW);
  /** Room over the strip: a row for its label, and one for the flag of the pointer. */
  private readonly top = computed(() => (this.pointerHz() === null ? 26 : 48));
  protected readonly labelY = computed(() => 16 - this.top());
  protected readonly frame = computed(() =>
    frame(this.width(), STRIP_HEIGHT + 2 + this.top(), {
      top: this.top(),
      right: this.isNarrow() ? 6 : 16,
      bottom: 2,
      left: this.isNarrow() ? 26 : 36,
    }),
  );
  protected readonly wholeScale = computed(() => {
    const { low, high } = this.range();
    return dialScale(low, high, this.frame().innerWidth, this.isLog());
  });
  protected readonly shown = computed<Window>(
    () => this.window() ?? [this.range().low, this.range().high],
  );
  protected readonly x = computed(() =>
    dialScale(...this.shown(), this.frame().innerWidth, this.isLog()),
  );
  /** The pointer stands on this band. */
  protected readonly pointer = computed(() => {
    const hz = this.pointerHz();
    const { low, high } = this.range();
    return hz !== null && hz >= low && hz <= high ? hz : null;
  });
  private readonly unit = computed(() => bandUnit(this.range().high));
  protected readonly levels = computed(() =>
    this.loudness()
      .ticks(3)
      .map((value) => ({ value, y: this.loudness()(value) })),
  );
  protected readonly heard = computed(() => heardMarks(this.band(), this.x(), this.loudness()));
  protected readonly breakthroughs = computed(() =>
    breakthroughCurves(this.band(), this.x(), this.loudness(), this.noise()),
  );
  protected readonly wanted = computed(() => wantedMarks(this.stations(), this.x(), this.noise()));
  protected readonly wantedPath = computed(() =>
    this.wanted()
      .map(({ x, y }) => `M${x.toFixed(2)},${STRIP.heard + STRIP.glass}V${y.toFixed(2)}`)
      .join(''),
  );
  protected readonly marks = computed<PlotMark[]>(() => [...this.heard(), ...this.wanted()]);
  /** Apart from what is judged: thousands of stations stay where they are while the IF moves. */
  private readonly wantedOrder = computed(() =>
    wantedMarks(this.stations(), this.wholeScale(), this.noise()).map(({ id, station }) => ({
      id,
      value: station.frequencyHz,
    })),
  );
  protected readonly order = computed(() => [
    ...this.band().responses.flatMap((each) =>
      each.dialHz === null || each.interferenceDb === null
        ? []
        : { id: responseMark(this.band().name, each), value: each.dialHz },
    ),
    ...this.wantedOrder(),
  ]);
  protected readonly harmonics = computed<StripHarmonic[]>(() => {
    const [low, high] = this.shown();
    const own = this.band().harmonics.map((each) => ({ ...each, of: 'IF' }));
    const beat = this.beatHarmonics().map((each) => ({ ...each, of: $localize`BFO` }));
    return [...own, ...beat]
      .filter(({ dialHz }) => dialHz >= low && dialHz <= high)
      .map(({ harmonic, dialHz, of }) => {
        const text = $localize`${harmonic}:order: × ${of}:source:`;
        return { id: text, text, order: harmonic, x: this.x()(dialHz) };
      });
  });
  protected readonly harmonicLabels = computed(() =>
    harmonicLabels(this.harmonics(), this.frame().innerWidth),
  );
  protected readonly labels = computed(() =>
    stripLabels(
      this.heard(),
      this.wanted(),
      this.nameOf,
      this.frame().innerWidth,
      this.isNarrow() ? 3 : 10,
    ),
  );
  protected readonly sentence = computed(() => stripSentence(this.band(), this.nameOf));
  protected readonly heading = computed(() => {
    const { low, high } = this.range();
    const { unit, write } = this.unit();
    return $localize`${this.band().name}:band:, ${write(low)}:low:–${write(high)}:high: ${unit}:unit:`;
  });
  protected readonly table = () => ({
    columns: stripColumns(),
    rows: stripRows(this.band(), this.nameOf),
  });
  private readonly byId = computed(() => new Map(this.stations().map((each) => [each.id, each])));

  protected readonly describe = (id: string) =>
    stripReadout(id, this.heard(), this.wanted(), this.nameOf, this.noise());

  private readonly nameOf = (id: number): string => this.byId().get(id)?.name ?? `#${id}`;
}
