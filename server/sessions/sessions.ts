import { randomUUID } from 'node:crypto';

import { Op, QueryTypes, type Sequelize } from 'sequelize';

import type { Membership, Role, User } from '../../shared/contracts/session.ts';
import type { Config } from '../config.ts';
import { inTransaction } from '../db/transaction.ts';
import type { Actor } from '../http/actor.ts';
import { NotFoundError, UnauthenticatedError } from '../http/errors.ts';
import { SessionModel } from './session-model.ts';
import { readSession, signSession } from './session-token.ts';

const MINUTE_MS = 60_000;
const HOUR_MS = 3_600_000;

interface People {
  profile(id: number): Promise<{ email: string; name: string; workshopId: number }>;
  beginIn(id: number, workshopId: number): Promise<void>;
}

interface Memberships {
  membershipsOf(accountId: number): Promise<Membership[]>;
}

type Settings = Pick<Config, 'SESSION_SECRET' | 'SESSION_IDLE_HOURS' | 'SESSION_ABSOLUTE_HOURS'>;

interface FoundSession {
  readonly accountId: number;
  readonly workshopId: number;
  readonly role: Role;
  readonly seenAt: Date;
}

/** Keeps the sessions: a row each, so that one can be ended at once and none lives for ever. */
export class Sessions {
  private readonly database: Sequelize;
  private readonly settings: Settings;
  private readonly people: People;
  private readonly memberships: Memberships;

  constructor(database: Sequelize, settings: Settings, people: People, memberships: Memberships) {
    this.database = database;
    this.settings = settings;
    this.people = people;
    this.memberships = memberships;
    SessionModel.register(database);
  }

  /** Begins a session where the account worked last; answers its token. */
  async begin(accountId: number): Promise<{ token: string; user: User }> {
    const { workshopId } = await this.people.profile(accountId);
    const all = await this.memberships.membershipsOf(accountId);
    const workshop = all.find(({ id }) => id === workshopId) ?? all[0];
    if (!workshop) throw new UnauthenticatedError('This account belongs to no workshop.');
    const id = randomUUID();
    await SessionModel.create({ id, accountId, workshopId: workshop.id, seenAt: new Date() });
    const actor = { accountId, workshopId: workshop.id, role: workshop.role, sessionId: id };
    return { token: signSession(id, this.settings.SESSION_SECRET), user: await this.user(actor) };
  }

  /** Who a token stands for; undefined if the session has ended, by hand or by time. */
  async actorOf(token: string): Promise<Actor | undefined> {
    const sessionId = readSession(token, this.settings.SESSION_SECRET);
    if (sessionId === undefined) return undefined;
    const [found] = await this.database.query<FoundSession>(
      `SELECT s.account_id AS accountId, s.workshop_id AS workshopId, m.role, s.seen_at AS seenAt
       FROM sessions s JOIN memberships m USING (account_id, workshop_id)
       WHERE s.id = :sessionId AND s.seen_at > :idleSince AND s.created_at > :begunSince`,
      { replacements: { sessionId, ...this.limits() }, type: QueryTypes.SELECT },
    );
    if (!found) return undefined;
    const { seenAt, ...actor } = found;
    if (Date.now() - seenAt.getTime() > MINUTE_MS) await this.touch(sessionId);
    return { ...actor, sessionId };
  }

  async user({ accountId, workshopId }: Actor): Promise<User> {
    const { email, name } = await this.people.profile(accountId);
    const workshops = await this.memberships.membershipsOf(accountId);
    const workshop = workshops.find(({ id }) => id === workshopId);
    if (!workshop) throw new UnauthenticatedError();
    return { id: accountId, email, name, workshop, workshops };
  }

  /** Goes to another workshop of the account, now and when it signs in again. */
  async change(actor: Actor, workshopId: number): Promise<User> {
    const all = await this.memberships.membershipsOf(actor.accountId);
    if (!all.some(({ id }) => id === workshopId)) throw new NotFoundError('workshop', workshopId);
    await inTransaction(this.database, async () => {
      await SessionModel.update({ workshopId }, { where: { id: actor.sessionId } });
      await this.people.beginIn(actor.accountId, workshopId);
    });
    return this.user({ ...actor, workshopId });
  }

  async end(sessionId: string): Promise<void> {
    await SessionModel.destroy({ where: { id: sessionId } });
  }

  async forgetOld(): Promise<void> {
    const { idleSince, begunSince } = this.limits();
    await SessionModel.destroy({
      where: {
        [Op.or]: [{ seenAt: { [Op.lte]: idleSince } }, { createdAt: { [Op.lte]: begunSince } }],
      },
    });
  }

  private async touch(id: string): Promise<void> {
    await SessionModel.update({ seenAt: new Date() }, { where: { id } });
  }

  private limits(): { idleSince: Date; begunSince: Date } {
    const { SESSION_IDLE_HOURS, SESSION_ABSOLUTE_HOURS } = this.settings;
    return {
      idleSince: new Date(Date.now() - SESSION_IDLE_HOURS * HOUR_MS),
      begunSince: new Date(Date.now() - SESSION_ABSOLUTE_HOURS * HOUR_MS),
    };
  }
}
