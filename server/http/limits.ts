import { createHash } from 'node:crypto';

import { QueryTypes, type Sequelize } from 'sequelize';

import type { Config } from '../config.ts';
import type { Actor } from './actor.ts';
import { TooManyRequestsError } from './errors.ts';

const MINUTE = 60;
const QUARTER = 15 * MINUTE;
const HOUR = 60 * MINUTE;

type Settings = Pick<
  Config,
  | 'LIMIT_SIGN_IN'
  | 'LIMIT_SIGN_IN_ADDRESS'
  | 'LIMIT_REGISTER'
  | 'LIMIT_COMPUTE_VISITOR'
  | 'LIMIT_COMPUTE_ACCOUNT'
  | 'LIMIT_SHARED_PLANS'
>;

/** How often a caller may do what is costly or can be abused; counted for all processes together. */
export class Limits {
  private readonly database: Sequelize;
  private readonly settings: Settings;

  constructor(database: Sequelize, settings: Settings) {
    this.database = database;
    this.settings = settings;
  }

  async computing(actor: Actor | undefined, address: string): Promise<void> {
    const { LIMIT_COMPUTE_ACCOUNT, LIMIT_COMPUTE_VISITOR } = this.settings;
    if (actor)
      await this.spend(`compute-account:${actor.accountId}`, LIMIT_COMPUTE_ACCOUNT, MINUTE);
    else await this.spend(`compute-address:${digest(address)}`, LIMIT_COMPUTE_VISITOR, MINUTE);
  }

  async registering(address: string): Promise<void> {
    await this.spend(`register:${digest(address)}`, this.settings.LIMIT_REGISTER, HOUR);
  }

  async readingShared(address: string): Promise<void> {
    await this.spend(`shared-plans:${digest(address)}`, this.settings.LIMIT_SHARED_PLANS, MINUTE);
  }

  /**
   * Tries a sign-in. It is counted before the password is tried, so that tries side by side are
   * counted too, and given back when it succeeds: only failures use the limit up.
   */
  async whileSigningIn<T>(email: string, address: string, attempt: () => Promise<T>): Promise<T> {
    const { LIMIT_SIGN_IN, LIMIT_SIGN_IN_ADDRESS } = this.settings;
    const ofAddress = `sign-in-address:${digest(address)}`;
    const ofAccount = `sign-in:${digest(email)}`;
    await this.spend(ofAddress, LIMIT_SIGN_IN_ADDRESS, QUARTER);
    await this.spend(ofAccount, LIMIT_SIGN_IN, QUARTER);
    const outcome = await attempt();
    await this.database.query('DELETE FROM request_counters WHERE name = ?', {
      replacements: [ofAccount],
    });
    await this.database.query(
      'UPDATE request_counters SET spent = spent - 1 WHERE name = ? AND spent > 0',
      { replacements: [ofAddress] },
    );
    return outcome;
  }

  async forgetOld(): Promise<void> {
    await this.database.query('DELETE FROM request_counters WHERE ends_at < NOW(3)');
  }

  private async spend(name: string, limit: number, seconds: number): Promise<void> {
    const [counter] = await this.database.query<{ spent: number; secondsLeft: number }>(
      `INSERT INTO request_counters (name, spent, ends_at)
       VALUES (:name, 1, NOW(3) + INTERVAL :seconds SECOND)
       ON DUPLICATE KEY UPDATE
         spent = IF(ends_at <= NOW(3), 1, spent + 1),
         ends_at = IF(ends_at <= NOW(3), VALUES(ends_at), ends_at)
       RETURNING spent, TIMESTAMPDIFF(SECOND, NOW(3), ends_at) AS secondsLeft`,
      { replacements: { name, seconds }, type: QueryTypes.SELECT },
    );
    if (counter && counter.spent > limit) throw new TooManyRequestsError(counter.secondsLeft + 1);
  }
}

/** Addresses and e-mails are counted without being listed. */
const digest = (text: string): string =>
  createHash('sha256').update(text).digest('base64url').slice(0, 32);
