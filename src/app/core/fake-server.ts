import { HttpErrorResponse, type HttpInterceptorFn, HttpResponse } from '@angular/common/http';
import { delay, mergeMap, of, throwError } from 'rxjs';

import type { Problem } from '../../../shared/contracts/problem';

/** A call that a page made. */
export interface Call {
  readonly call: string;
  readonly body: unknown;
}

type Answer = () => unknown;

/** Stands for the server in specs: answers by method and address, and keeps what was asked. */
export class FakeServer {
  readonly calls: Call[] = [];

  private readonly answers = new Map<string, Answer>();

  /** For `provideHttpClient(withInterceptors([server.intercept]))`. */
  readonly intercept: HttpInterceptorFn = ({ method, urlWithParams, body }) => {
    const call = `${method} ${urlWithParams}`;
    this.calls.push({ call, body });
    const answer = this.answers.get(call) ?? (() => problemOf(404, `Nothing at ${call}.`));
    return of(null).pipe(
      delay(0),
      mergeMap(() => {
        const found = answer();
        return found instanceof HttpErrorResponse
          ? throwError(() => found)
          : of(new HttpResponse({ status: 200, body: found }));
      }),
    );
  };

  /** Answers a call such as "GET /api/sites" from now on. */
  on(call: string, answer: Answer): this {
    this.answers.set(call, answer);
    return this;
  }

  /** Bodies sent with a call, in their order. */
  sent(call: string): unknown[] {
    return this.calls.filter((made) => made.call === call).map(({ body }) => body);
  }
}

/** A refusal, as the server would word it. */
export function problemOf(
  status: number,
  title: string,
  issues: Problem['issues'] = [],
  type = 'refused',
): HttpErrorResponse {
  const error: Problem = { type, title, status, instance: 'a1', issues };
  return new HttpErrorResponse({ status, error });
}
