import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  signal,
} from '@angular/core';

import type { Receiver } from '../../../../shared/radio/receiver';
import { CandidateLane } from '../../charts/candidate-lane/candidate-lane';
import { ChoiceChart } from '../../charts/choice-chart/choice-chart';
import { stationMark } from '../../charts/choice-chart/choice-layout';
import { type Window } from '../../charts/zoom-window';
import { CandidatesTable } from '../candidates-table/candidates-table';
import { choiceSentence } from '../trial/choice-sentence';
import { passband, rasterOn, shownAround, type Stretch } from '../trial/surroundings';
import { TrialStore } from '../trial/trial-store';
import { TrialInput } from '../trial-input/trial-input';

/** Where to put the IF: the chart with its marker, the candidates under it, and their table. */
@Component({
  selector: 'app-choice-section',
  templateUrl: './choice-section.html',
  styleUrl: './choice-section.scss',
  imports: [CandidateLane, CandidatesTable, ChoiceChart, TrialInput],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoiceSection {
  protected readonly store = inject(TrialStore);

  readonly receiver = input.required<Receiver>();
  /** What the advice names, hertz. */
  readonly bestHz = input.required<number | null>();

  protected readonly window = signal<Window | null>(null);
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

  protected settle(): void {
    const usual = shownAround(this.receiver());
    const trialHz = this.store.trialHz();
    if (trialHz >= usual.low && trialHz <= usual.high) this.range.set(usual);
    this.store.settle();
  }
}
