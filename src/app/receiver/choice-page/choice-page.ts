import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';

import { advise } from '../advice/advice';
import { AdvicePanel } from '../advice/advice-panel';
import { ChoiceSection } from '../choice-section/choice-section';
import { rasterOn, shownAround } from '../trial/surroundings';
import { TrialStore } from '../trial/trial-store';

/** Section of a receiver: the advice, and where to put the IF. */
@Component({
  selector: 'app-choice-page',
  templateUrl: './choice-page.html',
  styleUrl: './choice-page.scss',
  imports: [AdvicePanel, ChoiceSection],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ChoicePage {
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
}
