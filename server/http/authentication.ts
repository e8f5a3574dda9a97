import { parseCookie } from 'cookie';
import type { RequestHandler } from 'express';

import { type Actor, setActor } from './actor.ts';

/** Finds out who sends the request, from the session's cookie; without one it is a visitor. */
export function authentication(
  cookieName: string,
  sessions: { actorOf(token: string): Promise<Actor | undefined> },
): RequestHandler {
  return async (request, _response, next) => {
    const token = parseCookie(request.headers.cookie ?? '')[cookieName];
    const actor = token ? await sessions.actorOf(token) : undefined;
    if (actor) setActor(request, actor);
    next();
  };
}
