import type { CookieOptions, Request, Response } from 'express';

import type { User } from '../../shared/contracts/session.ts';
import type { Config } from '../config.ts';
import { actorOf } from '../http/actor.ts';
import type { Sessions } from './sessions.ts';

type Settings = Pick<Config, 'BEHIND_TLS' | 'SESSION_ABSOLUTE_HOURS'>;

/** The cookie's name; its prefix makes browsers refuse one that another host or plain http set. */
export const sessionCookie = ({ BEHIND_TLS }: Pick<Settings, 'BEHIND_TLS'>): string =>
  BEHIND_TLS ? '__Host-fallow-session' : 'fallow-session';

/** Lets people in and out: begins and ends sessions, and sets the cookie that names them. */
export class SessionDoor {
  private readonly sessions: Pick<Sessions, 'begin' | 'end'>;
  private readonly settings: Settings;

  constructor(sessions: Pick<Sessions, 'begin' | 'end'>, settings: Settings) {
    this.sessions = sessions;
    this.settings = settings;
  }

  /** Begins a new session; one that the caller had ends. */
  async enter(accountId: number, request: Request, response: Response): Promise<User> {
    const before = actorOf(request);
    const { token, user } = await this.sessions.begin(accountId);
    if (before) await this.sessions.end(before.sessionId);
    response.cookie(sessionCookie(this.settings), token, {
      ...this.cookieOptions(),
      maxAge: this.settings.SESSION_ABSOLUTE_HOURS * 3_600_000,
    });
    return user;
  }

  async leave(request: Request, response: Response): Promise<void> {
    const actor = actorOf(request);
    if (actor) await this.sessions.end(actor.sessionId);
    response.clearCookie(sessionCookie(this.settings), this.cookieOptions());
  }

  private cookieOptions(): CookieOptions {
    return { httpOnly: true, sameSite: 'lax', secure: this.settings.BEHIND_TLS, path: '/' };
  }
}
