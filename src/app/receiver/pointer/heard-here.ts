import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  linkedSignal,
  signal,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { RouterLink } from '@angular/router';

import { CauseSign } from '../../charts/cause-sign';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { formatQuantity, parseQuantity } from '../../ui/quantity/quantity';
import { Listen } from '../listen/listen';
import { TrialStore } from '../trial/trial-store';
import {
  beatCause,
  beatMark,
  beatOrigin,
  pitchWords,
  pointerSentence,
  strengthWords,
} from './beat-words';
import { PairList } from './pair-list';
import { PointerStore } from './pointer-store';
import { apartFromPairs } from './silent-pairs';

const FIRST = 6;

/** What is heard at the pointer: in words, by mark, and by ear. */
@Component({
  selector: 'app-heard-here',
  templateUrl: './heard-here.html',
  styleUrl: './heard-here.scss',
  imports: [
    CauseSign,
    Listen,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    PairList,
    ProblemNote,
    RouterLink,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HeardHere {
  private readonly trial = inject(TrialStore);
  protected readonly pointer = inject(PointerStore);

  protected readonly problem = signal('');
  protected readonly text = computed(() => formatQuantity(this.pointer.dialHz(), 'frequency'));
  private readonly answer = computed(() => this.pointer.heard.value());
  protected readonly sentence = computed(() => {
    const [answer, dialHz] = [this.answer(), this.pointer.dialHz()];
    return answer && dialHz !== null ? pointerSentence(answer, dialHz, this.trial.nameOf) : '';
  });
  protected readonly beats = computed(() => this.answer()?.causes ?? []);
  private readonly apart = computed(() => apartFromPairs(this.beats()));
  protected readonly pairs = computed(() => this.apart().pairs);
  private readonly length = linkedSignal({ source: this.text, computation: () => FIRST });
  protected readonly rows = computed(() =>
    this.apart()
      .heard.slice(0, this.length())
      .map((beat, at) => ({
        at,
        look: beatMark(beat),
        cause: beatCause(beat),
        name: beat.name,
        origin: beatOrigin(beat, this.trial.nameOf),
        pitch: pitchWords(beat),
        strength: strengthWords(beat),
      })),
  );
  protected readonly rest = computed(() => this.apart().heard.length - this.rows().length);

  protected read(typed: string): void {
    const reading = parseQuantity(typed, 'frequency');
    if ('problem' in reading) {
      this.problem.set(reading.problem);
      return;
    }
    if (reading.value === null || !this.pointer.isTuned(reading.value)) {
      this.problem.set($localize`Give a frequency that a band of the set tunes.`);
      return;
    }
    this.problem.set('');
    this.pointer.dialHz.set(reading.value);
    this.pointer.settle();
  }

  protected more(): void {
    this.length.set(this.apart().heard.length);
  }
}
