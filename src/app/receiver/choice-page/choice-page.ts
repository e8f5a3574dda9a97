import { ChangeDetectionStrategy, Component, computed, DestroyRef, inject } from '@angular/core';

import { advise } from '../advice/advice';
import { AdvicePanel } from '../advice/advice-panel';
import { CandidatesTable } from '../candidates-table/candidates-table';
import { CasesPanel } from '../cases/cases-panel';
import { ChoiceSection } from '../choice-section/choice-section';
import { CuresTable } from '../cures/cures-table';
import { HoursStrip } from '../hours/hours-strip';
import { rasterOn, shownAround } from '../trial/surroundings';
import { TrialStore } from '../trial/trial-store';
import { ChoiceViewStore } from './choice-view-store';

/** Section of a receiver: the advice, where to put the IF, what else would help, and when. */
@Component({
  selector: 'app-choice-page',
  templateUrl: './choice-page.html',
  styleUrl: './choice-page.scss',
  imports: [AdvicePanel, CandidatesTable, CasesPanel, ChoiceSection, CuresTable, HoursStrip],
  providers: [ChoiceViewStore],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoicePage {
  protected readonly store = inject(TrialStore);
  protected readonly view = inject(ChoiceViewStore);

  protected readonly receiver = computed(() => this.store.setup()?.receiver);
  protected readonly advice = computed(() => {
    const answer = this.store.candidates.value();
    const setup = this.store.setup();
    if (!answer || !setup || !this.store.fields.value()) return undefined;
    const { receiver, raster } = setup;
    const { channels } = rasterOn(raster, shownAround(receiver));
    const [stations, period] = [this.store.stations(), this.store.period()];
    const sites = 1 + (setup.others?.length ?? 0);
    return advise({ answer, receiver, stations, channels, period, sites });
  });

  constructor() {
    this.store.areCandidatesShown.set(true);
    inject(DestroyRef).onDestroy(() => {
      this.store.areCandidatesShown.set(false);
    });
  }
}
