import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatProgressBarModule } from '@angular/material/progress-bar';

import { ProblemNote } from '../../ui/page-state/problem-note';
import { advise } from '../advice/advice';
import { AdvicePanel } from '../advice/advice-panel';
import { ChoiceSection } from '../choice-section/choice-section';
import { DialStrips } from '../dial-strips/dial-strips';
import { ResponseTable } from '../response-table/response-table';
import { rasterOn, shownAround } from '../trial/surroundings';
import { TrialStore } from '../trial/trial-store';

/** A receiver on trial: advice, choice of IF, dial, and what is heard, from the trial store given. */
@Component({
  selector: 'app-trial-view',
  templateUrl: './trial-view.html',
  styleUrl: './trial-view.scss',
  imports: [
    AdvicePanel,
    ChoiceSection,
    DialStrips,
    MatProgressBarModule,
    ProblemNote,
    ResponseTable,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialView {
  protected readonly store = inject(TrialStore);

  protected readonly receiver = computed(() => this.store.setup()?.receiver);
  protected readonly advice = computed(() => {
    const answer = this.store.candidates.value();
    const setup = this.store.setup();
    if (!answer || !setup || !this.store.fields.value()) return undefined;
    const { receiver, raster } = setup;
    const { channels } = rasterOn(raster, shownAround(receiver));
    const [stations, period] = [this.store.stations(), this.store.period()];
    return advise({ answer, receiver, stations, channels, period });
  });

  protected showWorking(id: string): void {
    this.store.picked.set(id);
    this.store.worked.set(id);
  }
}
