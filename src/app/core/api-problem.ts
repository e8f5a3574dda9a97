import { HttpErrorResponse } from '@angular/common/http';

import { type Problem, problem } from '../../../shared/contracts/problem';

/** Reads any failure of a call as a problem a page can show. */
export function toProblem(error: unknown): Problem {
  const cause = error instanceof Error && error.cause !== undefined ? error.cause : error;
  if (!(cause instanceof HttpErrorResponse)) return unreadable();
  const body = problem.safeParse(cause.error);
  if (body.success) return body.data;
  return cause.status === 0 ? unreachable() : unexplained(cause.status);
}

const unreachable = (): Problem => ({
  type: 'server-unreachable',
  title: $localize`The server does not answer. Check the connection, then try again.`,
  status: 0,
  instance: '',
});

const unexplained = (status: number): Problem => ({
  type: 'unexplained',
  title: $localize`The server could not do this just now (${status}:status:). Try again in a moment.`,
  status,
  instance: '',
});

const unreadable = (): Problem => ({
  type: 'answer-unreadable',
  title: $localize`The answer could not be read. Reload the page: it may be older than the server.`,
  status: 0,
  instance: '',
});
