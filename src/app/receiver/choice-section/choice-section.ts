import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
} from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import { debounceTime } from 'rxjs';

import type { Receiver } from '../../../../shared/radio/receiver';
import { CandidateLane } from '../../charts/candidate-lane/candidate-lane';
import { ChoiceChart } from '../../charts/choice-chart/choice-chart';
import { stationMark } from '../../charts/choice-chart/choice-layout';
import { type Window } from '../../charts/zoom-window';
import { ChoiceViewStore } from '../choice-page/choice-view-store';
import { DayAndNight } from '../day-and-night/day-and-night';
import { Holding } from '../holding/holding';
import { choiceSentence } from '../trial/choice-sentence';
import { passband, rasterOn, shownAround, type Stretch } from '../trial/surroundings';
import { TrialStore } from '../trial/trial-store';
import { TrialInput } from '../trial-input/trial-input';

/** A wheel turns through many ranges: the address follows when it rests. */
const ZOOMED_MS = 300;

/** Where to put the IF: the chart with its marker, the candidates under it, how well it holds. */
@Component({
  selector: 'app-choice-section',
  templateUrl: './choice-section.html',
  styleUrl: './choice-section.scss',
  imports: [CandidateLane, ChoiceChart, DayAndNight, Holding, TrialInput],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoiceSection {
  private readonly view = inject(ChoiceViewStore);
  protected readonly store = inject(TrialStore);

  readonly receiver = input.required<Receiver>();
  /** What the advice names, hertz. */
  readonly bestHz = input.required<number | null>();

  protected readonly window = linkedSignal<Window | null>(() => this.view.window());
  /** Grows to hold an IF typed beyond it; shrinks again only when the marker has been let go. */
  protected readonly range = linkedSignal<{ base: Stretch; trialHz: number }, Stretch>({
    source: () => ({ base: shownAround(this.receiver()), trialHz: this.store.trialHz() }),
    computation: ({ base, trialHz }, previous) => {
      const before = previous?.source.base;
      const isSame = before?.low === base.low && before.high === base.high;
      const start = isSame && previous ? previous.value : base;
      const isInside = trialHz >= start.low && trialHz <= start.high;
      return isInside ? start : shownAround(this.receiver(), trialHz);
    },
  });
  protected readonly raster = computed(() =>
    rasterOn(this.store.setup()?.raster ?? [], this.range()),
  );
  protected readonly noiseAtIf = computed(() => this.store.noise()(this.store.presentHz()));
  protected readonly rejection = computed(() => {
    return passband(this.receiver(), this.store.trialHz());
  });
  protected readonly sentence = computed(() => {
    if (!this.store.fields.value()) return '';
    const [stations, trialHz] = [this.store.stations(), this.store.trialHz()];
    return choiceSentence(stations, this.range(), this.rejection(), trialHz);
  });
  protected readonly candidateMarks = computed(() =>
    (this.store.candidates.value()?.candidates ?? []).map(({ ifHz, deficitDb, reachable }) => ({
      ifHz,
      deficitDb,
      isReachable: reachable.ok,
    })),
  );
  /** In the chart a picked response is its station. */
  protected readonly pickedStation = computed(() => {
    const [kind, station] = this.store.picked()?.split('|') ?? [];
    return kind === 'response' ? stationMark(Number(station)) : this.store.picked();
  });

  constructor() {
    toObservable(this.window)
      .pipe(debounceTime(ZOOMED_MS), takeUntilDestroyed())
      .subscribe((window) => {
        const before = this.view.window();
        if (window?.map(Math.round).join() !== before?.join())
          void this.view.show({ window }, true);
      });
  }

  protected settle(): void {
    const usual = shownAround(this.receiver());
    const trialHz = this.store.trialHz();
    if (trialHz >= usual.low && trialHz <= usual.high) this.range.set(usual);
    this.store.settle();
  }
}
