import type { Problem } from '../../shared/contracts/problem.ts';

export type Issue = NonNullable<Problem['issues']>[number];

/** Failure the caller caused or can act on. Anything else that reaches the edge is a fault: 500. */
export abstract class OperationalError extends Error {
  abstract readonly status: number;
  abstract readonly type: string;
  /** Rejected fields, if the failure is about fields. */
  readonly issues?: readonly Issue[];
  /** Members added to the problem's body. */
  readonly details?: Readonly<Record<string, unknown>>;
  readonly headers?: Readonly<Record<string, string>>;

  constructor(message: string, options?: ErrorOptions) {
    super(message, options);
    this.name = new.target.name;
  }
}

/** A value that the contract lets pass but the server cannot take; names the field. */
export class InvalidError extends OperationalError {
  readonly status = 400;
  readonly type = 'invalid-input';
  override readonly issues: readonly Issue[];

  constructor(...issues: Issue[]) {
    super('Some values are not valid.');
    this.issues = issues;
  }
}

export class UnauthenticatedError extends OperationalError {
  readonly status = 401;
  readonly type: string = 'sign-in-needed';

  constructor(message = 'Sign in first.') {
    super(message);
  }
}

export class ForbiddenError extends OperationalError {
  readonly status = 403;
  readonly type: string;

  constructor(message: string, type = 'not-allowed') {
    super(message);
    this.type = type;
  }
}

export class NotFoundError extends OperationalError {
  readonly status = 404;
  readonly type: string;

  constructor(resource: string, id: number | string) {
    super(`No ${resource} with id ${id}.`);
    this.type = `${resource.replaceAll(' ', '-')}-not-found`;
  }
}

export class UnknownPathError extends OperationalError {
  readonly status = 404;
  readonly type = 'path-not-found';

  constructor() {
    super('There is nothing at this address.');
  }
}

export class MethodNotAllowedError extends OperationalError {
  readonly status = 405;
  readonly type = 'method-not-allowed';
  override readonly headers: Record<string, string>;

  constructor(allowed: readonly string[]) {
    super(`Only ${allowed.join(', ')} can be used at this address.`);
    this.headers = { Allow: allowed.join(', ') };
  }
}

/** The stored state forbids it; `details` may carry that state, for example `{ current }`. */
export class ConflictError extends OperationalError {
  readonly status = 409;
  readonly type: string;
  override readonly details: Readonly<Record<string, unknown>>;

  constructor(message: string, type = 'conflict', details: Readonly<Record<string, unknown>> = {}) {
    super(message);
    this.type = type;
    this.details = details;
  }
}

export class TooLargeError extends OperationalError {
  readonly status = 413;
  readonly type = 'too-large';
}

export class UnsupportedMediaError extends OperationalError {
  readonly status = 415;
  readonly type = 'unsupported-media-type';
}

export class KeyReusedError extends OperationalError {
  readonly status = 422;
  readonly type = 'idempotency-key-reused';

  constructor() {
    super('This Idempotency-Key was used for another request. Make a new one.');
  }
}

export class TooManyRequestsError extends OperationalError {
  readonly status = 429;
  readonly type = 'too-many-requests';
  override readonly headers: Record<string, string>;

  constructor(retryAfterSeconds: number) {
    super(`Too many requests. Try again in ${retryAfterSeconds} s.`);
    this.headers = { 'Retry-After': String(retryAfterSeconds) };
  }
}

export class UnavailableError extends OperationalError {
  readonly status = 503;
  readonly type = 'unavailable';
  override readonly headers = { 'Retry-After': '1' };

  constructor(message = 'The server cannot answer at this moment. Try again shortly.') {
    super(message);
  }
}
