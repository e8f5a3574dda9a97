import type { Request, Response } from 'express';
import type * as z from 'zod';

import type { Role } from '../../shared/contracts/session.ts';
import type { Actor } from './actor.ts';

/** Least standing a route asks for; a visitor has no session. */
export type Access = 'visitor' | Role;

/** What a handler is given: everything parsed and permitted. */
export interface Call<A extends Access, Body, Query> {
  readonly actor: A extends 'visitor' ? Actor | undefined : Actor;
  readonly body: Body;
  readonly query: Query;
  /** A whole-number part of the path; 404 where it is none. */
  readonly id: (name?: string) => number;
  readonly request: Request;
  readonly response: Response;
}

interface Row<A extends Access, Body extends z.ZodType, Query extends z.ZodType> {
  readonly method: 'get' | 'post' | 'put' | 'delete';
  /** Whole path, with `:name` for its variable parts. */
  readonly path: `/api/${string}`;
  readonly summary: string;
  readonly access: A;
  readonly body?: Body;
  readonly query?: Query;
  /** Status of success; 200 where left out. */
  readonly status?: 200 | 201 | 202 | 204;
  /** Schema of the answer of success. */
  readonly answer?: z.ZodType;
  /** Media type of an answer the handler writes itself, where it is not JSON. */
  readonly produces?: string;
  /** Field of the file, where the request is multipart; the handler reads it. */
  readonly upload?: string;
  /** Costly: takes a larger body and is counted against the limits of computing. */
  readonly computing?: true;
  /** Statuses of failure that are this route's own, beside the general ones. */
  readonly faults?: readonly number[];
  /** Calls the service and returns the answer's body, or writes the answer itself. */
  handle(call: Call<A, z.output<Body>, z.output<Query>>): unknown;
}

/** One operation of the API: what it takes, who may, what it answers and what it does. */
export type Route = Row<Access, z.ZodType, z.ZodType>;

/** Types a handler by the row it belongs to. */
export const route = <
  A extends Access,
  Body extends z.ZodType = z.ZodUndefined,
  Query extends z.ZodType = z.ZodUndefined,
>(
  row: Row<A, Body, Query>,
): Route => row;

/** A creation by a signed-in caller from a JSON body can be repeated without creating twice. */
export const isRepeatable = ({ method, status, access, upload }: Route): boolean =>
  method === 'post' && status === 201 && access !== 'visitor' && !upload;
