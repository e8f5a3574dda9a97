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

import { breakthroughHoursRequest } from '../../../../shared/contracts/breakthrough-hours';
import { DayStrip } from '../../charts/day-strip/day-strip';
import { clock } from '../../charts/day-strip/time-axis';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { ChoiceViewStore } from '../choice-page/choice-view-store';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { latestAnswer } from '../trial/latest-answer';
import { sourceFields } from '../trial/station-source';
import { TrialApi } from '../trial/trial-api';
import { TrialStore } from '../trial/trial-store';
import { hoursSentence, minutesOf } from './hours-words';
import { nightsOf } from './sun-hours';

const NOON = 12 * 60;
/** The earth turns by a degree in so many minutes. */
const MINUTES_A_DEGREE = 4;

/** Through a day at the site: when breakthrough and image rise and fall; an hour can be judged. */
@Component({
  selector: 'app-hours-strip',
  templateUrl: './hours-strip.html',
  styleUrl: './hours-strip.scss',
  imports: [DayStrip, MatButtonModule, MatFormFieldModule, MatInputModule, ProblemNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HoursStrip {
  private readonly api = inject(TrialApi);
  private readonly trial = inject(TrialStore);
  private readonly view = inject(ChoiceViewStore);
  protected readonly store = inject(ReceiverStore);

  /** The day in the address, else that of the moment judged, else today. */
  protected readonly date = computed(
    () => this.view.date() ?? (this.at() ?? new Date().toISOString()).slice(0, 10),
  );
  protected readonly dateProblem = signal('');
  /** The moment that is judged, UTC. */
  private readonly at = computed(() => {
    const { at } = this.store.address();
    return at === undefined ? undefined : new Date(at).toISOString();
  });
  /** The sun's place over the site decides; an assumed field knows no hours. */
  protected readonly place = computed(() => {
    const { latitude = null, longitude = null } = this.trial.setup()?.site ?? {};
    return latitude === null || longitude === null ? null : { latitude, longitude };
  });
  protected readonly isAssumed = computed(
    () => this.trial.setup()?.source.kind === 'every-channel',
  );

  protected readonly answer = latestAnswer(
    computed(
      () => {
        const setup = this.trial.setup();
        if (!setup || !this.place() || this.isAssumed()) return null;
        const { receiver, site, source } = setup;
        const onTrial = { ...receiver, ifHz: this.trial.trialHz() };
        return { receiver: onTrial, site, ...sourceFields(source), date: this.date() };
      },
      { equal: (one, other) => JSON.stringify(one) === JSON.stringify(other) },
    ),
    (body) => this.api.hours(body),
  );

  protected readonly sentence = computed(() => {
    const answer = this.answer.value();
    return answer ? hoursSentence(answer, this.trial.nameOf) : '';
  });
  protected readonly curves = computed(() => {
    const hours = this.answer.value()?.hours ?? [];
    const curve = (id: 'breakthrough' | 'image', name: string) => ({
      id,
      name,
      points: hours.map((hour) => ({ at: minutesOf(hour.at), level: hour[id]?.levelDb ?? null })),
    });
    return [
      curve('breakthrough', $localize`breakthrough`),
      curve('image', $localize`worst image`),
    ].filter(({ points }) => points.some(({ level }) => level !== null));
  });
  protected readonly nights = computed(() => {
    const place = this.place();
    return place ? nightsOf(place, this.date()) : [];
  });
  protected readonly rules = computed(() => {
    const at = this.at();
    const { longitude = 0 } = this.place() ?? {};
    const noon = (3 * NOON - MINUTES_A_DEGREE * longitude) % (2 * NOON);
    // Two names side by side would lie over each other: what was chosen is named.
    return at?.startsWith(this.date())
      ? [{ at: minutesOf(at), text: $localize`judged` }]
      : [{ at: noon, text: $localize`sun highest` }];
  });

  /** Time read out in the strip, minutes since midnight. */
  protected readonly picked = linkedSignal<string | null>(() => {
    const at = this.at();
    return at?.startsWith(this.date()) ? String(minutesOf(at)) : null;
  });
  protected readonly pickedText = computed(() => {
    const minutes = this.picked();
    return minutes === null ? '' : clock(Number(minutes));
  });
  protected readonly isJudged = computed(() => {
    const at = this.at();
    return at !== undefined && at === this.momentPicked();
  });

  protected choose(text: string): void {
    const { date } = breakthroughHoursRequest.shape;
    const reading = date.safeParse(text);
    this.dateProblem.set(reading.error?.issues[0]?.message ?? '');
    if (reading.success) void this.view.show({ date: reading.data });
  }

  /** Judges the whole page at the time read out. */
  protected judge(): void {
    const at = this.momentPicked();
    if (at === null) return;
    const minutes = Number(this.picked());
    const isNight = this.nights().some(([from, to]) => minutes >= from && minutes < to);
    void this.store.go({ at, period: isNight ? 'night' : 'day' });
  }

  private momentPicked(): string | null {
    const minutes = this.picked();
    return minutes === null ? null : `${this.date()}T${clock(Number(minutes))}:00.000Z`;
  }
}
