import {
  computed,
  DestroyRef,
  inject,
  Injector,
  type Signal,
  signal,
  untracked,
} from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import {
  catchError,
  debounceTime,
  identity,
  map,
  merge,
  type Observable,
  of,
  Subject,
  switchMap,
  tap,
} from 'rxjs';

import type { Problem } from '../../../../shared/contracts/problem';
import { toProblem } from '../../core/api-problem';

/** The answer to the question as it stands now; the one before stays until the new one is there. */
export interface LatestAnswer<Q, A> {
  readonly value: Signal<A | undefined>;
  /** What the value answers; not what is asked now while that is on its way. */
  readonly answered: Signal<Q | undefined>;
  readonly isLoading: Signal<boolean>;
  readonly problem: Signal<Problem | undefined>;
  /** Asks the same again. */
  readonly retry: () => void;
}

interface State<Q, A> {
  readonly value: A | undefined;
  readonly answered: Q | undefined;
  readonly isLoading: boolean;
  readonly problem: Problem | undefined;
}

/** Long enough to let a marker pass by, short enough not to be noticed. */
export const SETTLE_MS = 120;

/**
 * Asks a question whenever it changes and settles. An answer that comes after a newer question was
 * asked is dropped, never shown. Call while the component or store is made.
 * @param question What to ask; null: nothing, and no answer is kept.
 * @param ask Asks it; may answer more than once, each time better.
 * @param settleMs How long a question must stand before it is asked; 0: it is asked at once.
 */
export function latestAnswer<Q, A>(
  question: Signal<Q | null>,
  ask: (question: Q) => Observable<A>,
  settleMs = SETTLE_MS,
): LatestAnswer<Q, A> {
  const idle: State<Q, A> = {
    value: undefined,
    answered: undefined,
    isLoading: false,
    problem: undefined,
  };
  const state = signal(idle);
  const again = new Subject<void>();
  merge(
    toObservable(question, { injector: inject(Injector) }),
    again.pipe(map(() => untracked(question))),
  )
    .pipe(
      tap((asked) => {
        state.update((before) => ({ ...before, isLoading: asked !== null, problem: undefined }));
      }),
      settleMs > 0 ? debounceTime(settleMs) : identity,
      switchMap((asked) => (asked === null ? of(idle) : stated(asked, ask(asked)))),
      takeUntilDestroyed(inject(DestroyRef)),
    )
    .subscribe((next) => {
      state.set(next);
    });
  return {
    value: computed(() => state().value),
    answered: computed(() => state().answered),
    isLoading: computed(() => state().isLoading),
    problem: computed(() => state().problem),
    retry: () => {
      again.next();
    },
  };
}

const stated = <Q, A>(answered: Q, answer: Observable<A>): Observable<State<Q, A>> =>
  answer.pipe(
    map((value) => ({ value, answered, isLoading: false, problem: undefined })),
    catchError((error: unknown) =>
      of({ value: undefined, answered: undefined, isLoading: false, problem: toProblem(error) }),
    ),
  );
