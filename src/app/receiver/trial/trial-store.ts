import { computed, inject, Injectable, linkedSignal, signal, untracked } from '@angular/core';
import {
  catchError,
  EMPTY,
  map,
  merge,
  type Observable,
  share,
  switchMap,
  takeUntil,
  timer,
} from 'rxjs';

import type { Assessment, AssessmentInput } from '../../../../shared/contracts/assessment';
import type { CandidatesInput } from '../../../../shared/contracts/candidates';
import type { Period } from '../../../../shared/radio/site';
import { awaitedWords } from '../../charts/chart/awaited-words';
import { candidateRange, reachOf } from './candidate-range';
import { latestAnswer, SETTLE_MS } from './latest-answer';
import { sourceFields } from './station-source';
import { noiseAt } from './surroundings';
import { TrialApi } from './trial-api';
import { TrialEngine } from './trial-engine';
import { TrialInputs, type TrialSetup } from './trial-inputs';
import type { HeldList, TrialQuestion } from './trial-messages';

const PERIODS: Period[] = ['day', 'night'];
/** Responses drawn for a band: the worst of them, hidden ones too. */
const MOST_RESPONSES = 300;

const sameText = (one: unknown, other: unknown): boolean =>
  JSON.stringify(one) === JSON.stringify(other);

/** Keeps the answers to what is on trial up to date with its inputs. */
@Injectable()
export class TrialStore {
  private readonly api = inject(TrialApi);
  private readonly engine = inject(TrialEngine);
  private readonly inputs = inject(TrialInputs);

  readonly setup = this.inputs.setup;
  readonly period = this.inputs.period;
  readonly time = this.inputs.time;
  readonly trialHz = this.inputs.trialHz;
  readonly presentHz = computed(() => this.setup()?.receiver.ifHz ?? 0);
  readonly isMoved = computed(
    () => this.trialHz() !== this.presentHz() || this.setup()?.saved !== undefined,
  );
  /** How far the IF can be moved. */
  readonly reach = computed(() => {
    const receiver = this.setup()?.receiver;
    return receiver ? reachOf(receiver) : { low: 0, high: 0 };
  });

  /** Mark picked in any chart or table. */
  readonly picked = this.inputs.picked;
  /** Response whose working is shown. */
  readonly worked = signal<string | null>(null);

  readonly fields = latestAnswer(
    computed(
      () => {
        const setup = this.setup();
        return setup && { ...place(setup), period: this.time() };
      },
      { equal: sameText },
    ),
    (body) => this.api.fieldStrengths(body),
  );

  /** The section in sight shows the candidates. Judging them all is the dearest call. */
  readonly areCandidatesShown = signal(false);
  private readonly everyCandidate = computed(() => {
    const setup = this.setup();
    if (!setup) return null;
    const { receiver } = setup;
    return { ...cases(setup), receiver, periods: PERIODS, ...candidateRange(receiver) };
  });
  /** What was last asked stands while other sections are in sight. */
  private readonly candidatesQuestion = linkedSignal({
    source: () => (this.areCandidatesShown() ? this.everyCandidate() : undefined),
    computation: (shown, before?: { readonly value: CandidatesInput | null }) =>
      shown === undefined ? (before?.value ?? null) : shown,
    equal: sameText,
  });
  /** All candidates; they do not depend on the IF on trial. */
  readonly candidates = latestAnswer(this.candidatesQuestion, (body) => this.api.candidates(body));

  /** The set as it stands now: only its verdict is used. */
  readonly present = latestAnswer(
    computed(
      () => {
        const setup = this.setup();
        if (!setup) return null;
        const receiver = setup.saved ?? setup.receiver;
        return { ...place(setup), receiver, period: this.time(), limit: 1 };
      },
      { equal: sameText },
    ),
    (body) => this.api.assess(body).pipe(map(({ verdict }) => verdict)),
  );

  /** The list of the fields as they stand, for judging on the client; null while it changes. */
  private readonly list = computed<HeldList | null>(() => {
    const [setup, answer] = [this.setup(), this.fields.value()];
    if (!setup || !answer || this.fields.isLoading()) return null;
    return { site: setup.site, raster: setup.raster, fields: answer.fields };
  });

  /** The set with the IF on trial: judged here at once, then as the server judges it. */
  readonly judged = latestAnswer(
    computed(
      () => {
        const setup = this.setup();
        return setup && { ...place(setup), ...this.onTrial(setup) };
      },
      { equal: sameText },
    ),
    (question) => this.judge(question),
    0,
  );

  /** While a new judgement is on its way: for what, and what the one in sight holds for. */
  readonly awaited = computed(() => {
    const before = this.judged.answered()?.receiver.ifHz;
    return this.judged.isLoading() && before !== undefined
      ? awaitedWords(this.trialHz(), before)
      : null;
  });

  /** The IF on trial as a candidate, when it is none of the round ones. */
  private readonly ownCandidate = latestAnswer(
    computed(
      () => {
        const setup = this.setup();
        const trialHz = this.trialHz();
        const known = this.candidates.value()?.candidates;
        if (!this.areCandidatesShown() || !setup || !known) return null;
        if (known.some(({ ifHz }) => ifHz === trialHz)) return null;
        const { receiver } = setup;
        const only = { fromHz: trialHz, toHz: trialHz, stepHz: 1 };
        return { ...cases(setup), receiver, periods: PERIODS, ...only };
      },
      { equal: sameText },
    ),
    (body) => this.api.candidates(body),
  );

  readonly trialCandidate = computed(() => {
    const trialHz = this.trialHz();
    const answer = this.candidates.value();
    return [
      answer?.present,
      ...(answer?.candidates ?? []),
      ...(this.ownCandidate.value()?.candidates ?? []),
    ].find((each) => each?.ifHz === trialHz);
  });

  /** Noise in the set's bandwidth against the frequency, dB(µV/m). */
  readonly noise = computed<(hz: number) => number | null>(() => {
    const setup = this.setup();
    return setup ? noiseAt(setup.site, setup.receiver) : () => null;
  });
  readonly stations = computed(() =>
    (this.fields.value()?.fields ?? []).map(({ station, ...each }) => ({ id: station, ...each })),
  );
  private readonly names = computed(
    () => new Map(this.stations().map(({ id, name }) => [id, name])),
  );

  private readonly answers = [
    this.fields,
    this.candidates,
    this.present,
    this.judged,
    this.ownCandidate,
  ];
  readonly isLoading = computed(() => this.answers.some(({ isLoading }) => isLoading()));
  readonly problem = computed(() =>
    this.answers.map(({ problem }) => problem()).find((each) => each !== undefined),
  );

  readonly nameOf = (station: number): string => this.names().get(station) ?? `#${station}`;

  retry(): void {
    for (const each of this.answers) if (each.problem()) each.retry();
  }

  /** Puts an IF on trial and writes it into the address. */
  take(ifHz: number): void {
    this.trialHz.set(ifHz);
    this.inputs.settle();
  }

  settle(): void {
    this.inputs.settle();
  }

  private judge(
    question: AssessmentInput & Pick<TrialQuestion, 'receiver' | 'limit'>,
  ): Observable<Assessment> {
    const confirmed = timer(SETTLE_MS).pipe(
      switchMap(() => this.api.assess(question)),
      share(),
    );
    const list = untracked(this.list);
    const { receiver, limit } = question;
    const period = untracked(this.period);
    const tried = list ? this.engine.assess(list, { receiver, period, limit }) : EMPTY;
    return merge(
      tried.pipe(
        takeUntil(confirmed),
        catchError(() => EMPTY),
      ),
      confirmed,
    );
  }

  private onTrial({ receiver }: TrialSetup) {
    return {
      receiver: { ...receiver, ifHz: this.trialHz() },
      period: this.time(),
      leaveOutBetterThan: null,
      limit: MOST_RESPONSES,
    };
  }
}

const place = ({ site, source }: Pick<TrialSetup, 'site' | 'source'>) => ({
  site,
  ...sourceFields(source),
});

/** Several sites at once where there are any: the best IF is then the one best where it is worst. */
const cases = (setup: TrialSetup) =>
  setup.others?.length ? { cases: [setup, ...setup.others].map(place) } : place(setup);
