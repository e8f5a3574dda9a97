import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  linkedSignal,
  signal,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatProgressBarModule } from '@angular/material/progress-bar';

import { CandidateLane } from '../../charts/candidate-lane/candidate-lane';
import { ChoiceChart } from '../../charts/choice-chart/choice-chart';
import { stationMark } from '../../charts/choice-chart/choice-layout';
import { kilohertz } from '../../charts/readings';
import { type Window } from '../../charts/zoom-window';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { advise } from '../advice/advice';
import { Caution } from '../advice/caution';
import { verdictSentences } from '../advice/verdict-words';
import { CandidatesTable } from '../candidates-table/candidates-table';
import { DialStrips } from '../dial-strips/dial-strips';
import { ResponseTable } from '../response-table/response-table';
import { choiceSentence } from '../trial/choice-sentence';
import { noiseAt, passband, rasterOn, shownAround, type Stretch } from '../trial/surroundings';
import { TrialStore } from '../trial/trial-store';
import { TrialInput } from '../trial-input/trial-input';

/** A receiver on trial: advice, choice of IF, dial, and what is heard, from the trial store given. */
@Component({
  selector: 'app-trial-view',
  templateUrl: './trial-view.html',
  styleUrl: './trial-view.scss',
  imports: [
    CandidateLane,
    CandidatesTable,
    Caution,
    ChoiceChart,
    DialStrips,
    MatButtonModule,
    MatProgressBarModule,
    ProblemNote,
    ResponseTable,
    TrialInput,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialView {
  protected readonly store = inject(TrialStore);
  protected readonly window = signal<Window | null>(null);

  protected readonly receiver = computed(() => this.store.setup()?.receiver);
  /** Grows to hold an IF typed beyond it, and stays still while the marker is dragged. */
  protected readonly range = linkedSignal<{ base: Stretch; trialHz: number }, Stretch>({
    source: () => {
      const receiver = this.receiver();
      const trialHz = this.store.trialHz();
      return { base: receiver ? shownAround(receiver) : { low: 0, high: 1 }, trialHz };
    },
    computation: ({ base, trialHz }, previous) => {
      const isSame =
        previous?.source.base.low === base.low && previous.source.base.high === base.high;
      const start = isSame ? previous.value : base;
      const isInside = trialHz >= start.low && trialHz <= start.high;
      const receiver = this.receiver();
      return isInside || !receiver ? start : shownAround(receiver, trialHz);
    },
  });
  protected readonly raster = computed(() =>
    rasterOn(this.store.setup()?.raster ?? [], this.range()),
  );
  protected readonly noise = computed(() => {
    const setup = this.store.setup();
    return setup ? noiseAt(setup.site, setup.receiver) : () => null;
  });
  protected readonly noiseAtIf = computed(() => this.noise()(this.store.presentHz()));
  protected readonly rejection = computed(() => {
    const receiver = this.receiver();
    return receiver ? passband(receiver, this.store.trialHz()) : () => 0;
  });
  protected readonly sentence = computed(() =>
    choiceSentence(this.store.stations(), this.range(), this.rejection(), this.store.trialHz()),
  );
  protected readonly candidateMarks = computed(() =>
    (this.store.candidates.value()?.candidates ?? []).map(({ ifHz, deficitDb, reachable }) => ({
      ifHz,
      deficitDb,
      isReachable: reachable.ok,
    })),
  );
  protected readonly advice = computed(() => {
    const answer = this.store.candidates.value();
    const receiver = this.receiver();
    if (!answer || !receiver || !this.store.fields.value()) return undefined;
    const stations = this.store.stations();
    const { channels } = this.raster();
    return advise({ answer, receiver, stations, channels, period: this.store.period() });
  });
  protected readonly verdict = computed(() => {
    const judged = this.store.judged.value();
    if (!judged) return [];
    const present = this.store.isMoved() ? this.store.present.value() : undefined;
    return verdictSentences(judged.verdict, present, this.store.period(), this.store.nameOf);
  });
  protected readonly target = computed(() => kilohertz(this.advice()?.ifHz ?? 0));
  protected readonly onTrial = computed(() => kilohertz(this.store.trialHz()));
  protected readonly skipped = computed(() => {
    const counts = new Map<string, number>();
    for (const { reason } of this.store.judged.value()?.skipped ?? []) {
      counts.set(reason, (counts.get(reason) ?? 0) + 1);
    }
    return [...counts].map(([reason, count]) => ({ reason, count }));
  });
  /** In the chart a picked response is its station. */
  protected readonly pickedStation = computed(() => {
    const [kind, , station] = this.store.picked()?.split('|') ?? [];
    return kind === 'response' ? stationMark(Number(station)) : this.store.picked();
  });

  protected showWorking(id: string): void {
    this.store.picked.set(id);
    this.store.worked.set(id);
  }
}
