import type { Request } from 'express';

import type { Role } from '../../shared/contracts/session.ts';
import { ForbiddenError, UnauthenticatedError } from './errors.ts';

/** Who acts, in which workshop, with which role there. */
export interface Actor {
  readonly accountId: number;
  readonly workshopId: number;
  readonly role: Role;
  readonly sessionId: string;
}

const RANK: Readonly<Record<Role, number>> = { member: 0, librarian: 1, admin: 2 };
const actors = new WeakMap<Request, Actor>();

/** Remembers who sent a request; called once, by the authentication. */
export function setActor(request: Request, actor: Actor): void {
  actors.set(request, actor);
}

/** Who sent the request, if signed in. */
export const actorOf = (request: Request): Actor | undefined => actors.get(request);

/** Who sent the request. */
export function requireActor(request: Request): Actor {
  const actor = actors.get(request);
  if (!actor) throw new UnauthenticatedError();
  return actor;
}

/** Whether the actor has at least the given role in the session's workshop. */
export const hasRole = (actor: Actor, least: Role): boolean => RANK[actor.role] >= RANK[least];

/** Refuses an actor below the given role. */
export function requireRole(actor: Actor, least: Role): void {
  if (hasRole(actor, least)) return;
  throw new ForbiddenError(
    `Only ${least === 'admin' ? 'an admin' : 'a librarian or an admin'} may.`,
  );
}

/** A member changes what is his or her own; an admin changes everything. */
export const mayChange = (actor: Actor, ownerId: number | null): boolean =>
  actor.accountId === ownerId || actor.role === 'admin';
