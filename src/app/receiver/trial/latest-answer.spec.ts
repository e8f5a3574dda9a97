import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Subject, throwError } from 'rxjs';

import { latestAnswer } from './latest-answer';

const settle = async () => {
  TestBed.tick();
  await vi.advanceTimersByTimeAsync(200);
};

describe('latestAnswer', () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());

  it('never shows an answer to a question that is no longer asked', async () => {
    const question = signal<string | null>('first');
    const calls = new Map<string, Subject<string>>();
    const answer = TestBed.runInInjectionContext(() =>
      latestAnswer(question, (asked) => {
        const call = new Subject<string>();
        calls.set(asked, call);
        return call;
      }),
    );
    await settle();
    question.set('second');
    await settle();

    calls.get('first')?.next('stale');
    expect(answer.value()).toBeUndefined();

    calls.get('second')?.next('fresh');
    expect(answer.value()).toBe('fresh');
  });

  it('says which question its value answers while the next is on its way', async () => {
    const question = signal<string | null>('first');
    const call = new Subject<string>();
    const answer = TestBed.runInInjectionContext(() => latestAnswer(question, () => call));
    await settle();
    call.next('one');
    question.set('second');
    TestBed.tick();

    expect([answer.value(), answer.answered(), answer.isLoading()]).toEqual(['one', 'first', true]);
  });

  it('asks once when the question settles', async () => {
    const question = signal<number | null>(0);
    const ask = vi.fn(() => new Subject<number>());
    TestBed.runInInjectionContext(() => latestAnswer(question, ask));
    for (const next of [1, 2, 3]) {
      question.set(next);
      TestBed.tick();
      await vi.advanceTimersByTimeAsync(50);
    }
    await settle();

    expect(ask.mock.calls).toEqual([[3]]);
  });

  it('keeps the answer before while a new one is on its way', async () => {
    const question = signal<string | null>('first');
    const calls: Subject<string>[] = [];
    const answer = TestBed.runInInjectionContext(() =>
      latestAnswer(question, () => {
        const call = new Subject<string>();
        calls.push(call);
        return call;
      }),
    );
    await settle();
    calls[0]?.next('one');
    question.set('second');
    await settle();

    expect(answer.value()).toBe('one');
    expect(answer.isLoading()).toBe(true);
  });

  it('says the problem, and asks again when told to', async () => {
    const question = signal<string | null>('first');
    let isBroken = true;
    const call = new Subject<string>();
    const answer = TestBed.runInInjectionContext(() =>
      latestAnswer(question, () => (isBroken ? throwError(() => new Error('away')) : call)),
    );
    await settle();
    expect(answer.problem()?.title).not.toBe('');

    isBroken = false;
    answer.retry();
    await settle();
    call.next('well again');
    expect(answer.problem()).toBeUndefined();
    expect(answer.value()).toBe('well again');
  });
});
