import { ChangeDetectionStrategy, Component, computed, input, model, output } from '@angular/core';
import { scaleLinear } from 'd3';

import { formatFrequency } from '../../ui/frequency-pipe';
import { Chart } from '../chart/chart';
import { frame, NARROW } from '../frame';
import { observeWidth } from '../observe-width';
import { Plot } from '../plot/plot';
import { type Readout } from '../plot/plot-mark';
import { kilohertz, tenths, whole } from '../readings';
import { type Window } from '../zoom-window';

const HEIGHT = 84;

/** A candidate for the IF, as the lane draws it. */
export interface CandidateMark {
  readonly ifHz: number;
  /** Decibels missing to good reception: the fewer, the better. */
  readonly deficitDb: number;
  readonly isReachable: boolean;
}

/** What each candidate for the IF leaves to be desired, as bars hanging under the frequency axis. */
@Component({
  selector: 'app-candidate-lane',
  templateUrl: './candidate-lane.html',
  styleUrl: './candidate-lane.scss',
  imports: [Chart, Plot],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CandidateLane {
  readonly candidates = input.required<readonly CandidateMark[]>();
  readonly bestHz = input<number | null>(null);
  readonly presentHz = input.required<number>();
  readonly trialHz = input.required<number>();
  readonly range = input.required<{ readonly low: number; readonly high: number }>();
  readonly window = model<Window | null>(null);
  /** The candidate picked, as text of its frequency. */
  readonly picked = model<string | null>(null);
  /** Puts a candidate on trial. */
  readonly taken = output<number>();

  private readonly width = observeWidth();
  protected readonly heading = $localize`What each candidate leaves to be desired`;
  protected readonly sentence = computed(() => {
    const at = (hz: number | null) => this.candidates().find(({ ifHz }) => ifHz === hz);
    const [best, now] = [at(this.bestHz()), at(this.presentHz())];
    const said = ({ ifHz, deficitDb }: CandidateMark) =>
      $localize`${tenths(deficitDb)}:level: dB at ${kilohertz(ifHz)}:frequency: kHz`;
    return [
      best ? $localize`Advised: ${said(best)}:best:.` : '',
      now ? $localize`As it is: ${said(now)}:now:.` : '',
      $localize`Shorter is better.`,
    ]
      .filter(Boolean)
      .join(' ');
  });
  protected readonly table = () => ({
    columns: [$localize`IF, kHz`, $localize`Left to be desired, dB`, $localize`Within reach`],
    rows: this.candidates()
      .toSorted((a, b) => a.ifHz - b.ifHz)
      .map(({ ifHz, deficitDb, isReachable }) => ({
        id: String(ifHz),
        cells: [kilohertz(ifHz), tenths(deficitDb), isReachable ? $localize`yes` : $localize`no`],
      })),
  });
  protected readonly leadsOn = $localize`Enter puts it on trial.`;
  protected readonly frame = computed(() => {
    const isNarrow = this.width() < NARROW;
    const [left, right] = isNarrow ? [36, 8] : [48, 16];
    return frame(this.width(), HEIGHT, { top: 16, right, bottom: 6, left });
  });
  protected readonly wholeScale = computed(() =>
    scaleLinear([this.range().low, this.range().high], [0, this.frame().innerWidth]),
  );
  protected readonly x = computed(() =>
    scaleLinear(
      [...(this.window() ?? [this.range().low, this.range().high])],
      [0, this.frame().innerWidth],
    ),
  );
  protected readonly worstDb = computed(() =>
    Math.max(1, ...this.candidates().map(({ deficitDb }) => deficitDb)),
  );
  private readonly y = computed(() =>
    scaleLinear([0, this.worstDb()], [0, this.frame().innerHeight]),
  );
  protected readonly worstText = computed(() => whole(this.worstDb()));
  protected readonly bars = computed(() =>
    this.candidates()
      .map((candidate) => ({
        ...candidate,
        id: String(candidate.ifHz),
        x: this.x()(candidate.ifHz),
        y: this.y()(candidate.deficitDb),
        isBest: candidate.ifHz === this.bestHz(),
        isOnTrial: candidate.ifHz === this.trialHz(),
      }))
      .filter(({ x }) => x >= 0 && x <= this.frame().innerWidth),
  );
  protected readonly thickness = computed(() => {
    const [first, second] = [...this.bars()].sort((a, b) => a.x - b.x);
    return first && second ? Math.min(2.5, (second.x - first.x) * 0.5) : 2.5;
  });
  protected readonly order = computed(() =>
    this.candidates().map(({ ifHz }) => ({ id: String(ifHz), value: ifHz })),
  );
  protected readonly present = computed(() => this.x()(this.presentHz()));

  protected readonly describe = (id: string): Readout | undefined => {
    const found = this.candidates().find(({ ifHz }) => String(ifHz) === id);
    if (!found) return undefined;
    return {
      title: $localize`IF at ${formatFrequency(found.ifHz)}:frequency:`,
      lines: [
        {
          label: $localize`Left to be desired`,
          value: $localize`${tenths(found.deficitDb)}:level: dB`,
        },
        {
          label: $localize`Within reach`,
          value: found.isReachable ? $localize`yes` : $localize`no`,
        },
      ],
    };
  };
}
