import { ChangeDetectionStrategy, Component, computed, effect, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, type ValidationErrors } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import * as z from 'zod';

import { frequencyHz } from '../../../../shared/contracts/quantities';
import { toProblem } from '../../core/api-problem';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { Submission } from '../../ui/form-problems/submission';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { QuantityInput } from '../../ui/quantity/quantity-input';
import { Caution } from '../advice/caution';
import { pointerSentence } from '../pointer/beat-words';
import { PairList } from '../pointer/pair-list';
import { PointerStore } from '../pointer/pointer-store';
import { apartFromPairs } from '../pointer/silent-pairs';
import { TrialStore } from '../trial/trial-store';
import { whistleCauses } from './whistle-words';

/** What is noted of a whistle. */
const noted = z.object({
  dialHz: frequencyHz,
  pitchHz: z.number().min(0).max(20_000, 'Give a pitch of 20 kHz or less.').nullable(),
  pitchSlope: z.number().min(-100).max(100, 'Give a slope from -100 to 100.').nullable(),
});

/** Section of a receiver: what a whistle may be, and the test that tells. */
@Component({
  selector: 'app-whistle-page',
  templateUrl: './whistle-page.html',
  styleUrl: './whistle-page.scss',
  imports: [
    Caution,
    FormProblems,
    MatButtonModule,
    PairList,
    ProblemNote,
    QuantityInput,
    ReactiveFormsModule,
    RouterLink,
  ],
  providers: [PointerStore],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WhistlePage {
  private readonly trial = inject(TrialStore);
  protected readonly pointer = inject(PointerStore);

  protected readonly form = new FormGroup({
    dialHz: new FormControl<number | null>(null, ({ value }) =>
      this.outside(value as number | null),
    ),
    pitchHz: new FormControl<number | null>(null),
    pitchSlope: new FormControl<number | null>(null),
  });
  protected readonly submission = new Submission(this.form, noted, toProblem);

  protected readonly sentence = computed(() => {
    const [answer, dialHz] = [this.pointer.heard.value(), this.pointer.dialHz()];
    return answer && dialHz !== null ? pointerSentence(answer, dialHz, this.trial.nameOf) : '';
  });
  private readonly apart = computed(() => apartFromPairs(this.pointer.heard.value()?.causes ?? []));
  protected readonly pairs = computed(() => this.apart().pairs);
  protected readonly causes = computed(() => whistleCauses(this.apart().heard, this.trial.nameOf));

  constructor() {
    effect(() => {
      const { pitchHz, pitchSlope } = this.pointer.asked();
      this.form.setValue({ dialHz: this.pointer.dialHz(), pitchHz, pitchSlope });
    });
  }

  protected async ask(): Promise<void> {
    await this.submission.send(this.form.getRawValue(), (valid) => this.pointer.ask(valid));
  }

  private outside(value: number | null): ValidationErrors | null {
    return value === null || this.pointer.isTuned(value)
      ? null
      : { problem: $localize`Give a frequency that a band of the set tunes.` };
  }
}
