import { inject, Injectable, InjectionToken } from '@angular/core';
import { EMPTY, Observable } from 'rxjs';

import type { Assessment } from '../../../../shared/contracts/assessment';
import type { HeldList, TrialMessage, TrialQuestion, TrialReply } from './trial-messages';

/** What of a worker is used. */
export type TrialWorker = Pick<Worker, 'postMessage' | 'onmessage' | 'onerror'>;

/** Starts the worker; null where there are none, as in tests. */
export const TRIAL_WORKER = new InjectionToken<(() => Promise<TrialWorker>) | null>(
  'the engine beside the page',
  {
    factory: () =>
      typeof Worker === 'undefined'
        ? null
        : async () => (await import('./open-trial-worker')).openTrialWorker(),
  },
);

interface Order {
  readonly list: HeldList;
  readonly question: TrialQuestion;
  readonly answer: (assessment: Assessment | undefined) => void;
}

/**
 * Judges on the client, in a worker, from a list that is there already. One question is worked on at
 * a time; of those that wait only the newest is kept. What cannot be judged here completes without
 * an answer: the server judges as well. The worker stays for the session: it costs less than starting
 * it again.
 */
@Injectable({ providedIn: 'root' })
export class TrialEngine {
  private readonly open = inject(TRIAL_WORKER);
  private worker: Promise<TrialWorker> | undefined;
  private held: HeldList | undefined;
  private current: Order | undefined;
  private next: Order | undefined;

  assess(list: HeldList, question: TrialQuestion): Observable<Assessment> {
    if (!this.open) return EMPTY;
    return new Observable((subscriber) => {
      const answer = (assessment: Assessment | undefined) => {
        if (assessment) subscriber.next(assessment);
        subscriber.complete();
      };
      const order = { list, question, answer };
      this.next?.answer(undefined);
      this.next = order;
      if (!this.current) void this.work();
      return () => {
        if (this.next === order) this.next = undefined;
      };
    });
  }

  private async work(): Promise<void> {
    const order = (this.current = this.next);
    this.next = undefined;
    if (!order) return;
    const worker = await this.ready();
    if (this.held !== order.list) this.post(worker, { kind: 'hold', list: order.list });
    this.held = order.list;
    this.post(worker, { kind: 'assess', question: order.question });
  }

  private ready(): Promise<TrialWorker> {
    this.worker ??= (this.open?.() ?? Promise.reject(new Error('no worker'))).then((worker) => {
      worker.onmessage = ({ data }: MessageEvent<TrialReply>) => {
        this.finish(data.kind === 'judged' ? data.assessment : undefined);
      };
      worker.onerror = () => {
        this.finish(undefined);
      };
      return worker;
    });
    return this.worker;
  }

  private finish(assessment: Assessment | undefined): void {
    const done = this.current;
    this.current = undefined;
    done?.answer(assessment);
    void this.work();
  }

  private post(worker: TrialWorker, message: TrialMessage): void {
    worker.postMessage(message);
  }
}
