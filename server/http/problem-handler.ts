import type { ErrorRequestHandler, Request, Response } from 'express';
import * as z from 'zod';

import type { Problem } from '../../shared/contracts/problem.ts';
import { isDatabaseAway } from '../db/database-faults.ts';
import type { Logger } from '../logger.ts';
import { OperationalError, UnavailableError } from './errors.ts';
import { issuesOf } from './issues.ts';
import { requestId } from './request-log.ts';

type Body = Omit<Problem, 'instance'>;

/** The only place that turns an exception into an answer. Mounted last. */
export function problemHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) {
      next(error); // Too late to answer: let Express close the connection.
      return;
    }
    const cause = isDatabaseAway(error) ? new UnavailableError() : error;
    const body = toProblem(cause);
    if (body.status >= 500) note(log, error, request, response, body.status);
    if (cause instanceof OperationalError && cause.headers) response.set(cause.headers);
    response
      .status(body.status)
      .set('Cache-Control', 'no-store')
      .type('application/problem+json')
      .json({ ...body, instance: requestId(response) });
  };
}

function note(log: Logger, error: unknown, request: Request, response: Response, status: number) {
  const facts = { error, requestId: requestId(response), path: request.path };
  if (status === 503) log.warn(facts, 'database away');
  else log.error(facts, 'request failed');
}

function toProblem(error: unknown): Body {
  if (error instanceof z.ZodError) {
    return {
      type: 'invalid-input',
      title: 'Some values are not valid.',
      status: 400,
      issues: issuesOf(error),
    };
  }
  if (error instanceof OperationalError) {
    const { type, message, status, issues, details } = error;
    return { type, title: message, status, ...(issues && { issues: [...issues] }), ...details };
  }
  return clientFault(error) ?? internal;
}

const internal: Body = {
  type: 'internal',
  title: 'Something went wrong on our side.',
  status: 500,
};

/** What Express and its body parser throw for requests that cannot be read. */
const UNREADABLE: Readonly<Record<string, Body>> = {
  'entity.parse.failed': {
    type: 'malformed-json',
    title: 'The body is not valid JSON.',
    status: 400,
  },
  'entity.too.large': {
    type: 'too-large',
    title: 'The body is larger than this address takes.',
    status: 413,
  },
  'encoding.unsupported': {
    type: 'unsupported-media-type',
    title: 'Send the body plain or compressed by gzip, deflate or br.',
    status: 415,
  },
  'charset.unsupported': {
    type: 'unsupported-media-type',
    title: 'Send JSON in UTF-8.',
    status: 415,
  },
};

function clientFault(error: unknown): Body | undefined {
  if (!(error instanceof Error)) return undefined;
  const { type, status } = error as Error & { type?: unknown; status?: unknown };
  const known = typeof type === 'string' ? UNREADABLE[type] : undefined;
  if (known) return known;
  if (typeof status !== 'number' || status < 400 || status > 499) return undefined;
  return { type: 'bad-request', title: 'The request could not be read.', status };
}
