import { createHash } from 'node:crypto';

import { Op, type Sequelize, UniqueConstraintError } from 'sequelize';

import { inTransaction } from '../db/transaction.ts';
import { InvalidError, KeyReusedError } from './errors.ts';
import { IdempotencyKeyModel } from './idempotency-key-model.ts';
import type { Access, Call, Route } from './route.ts';

const KEPT_MS = 24 * 3_600_000;
const MAX_KEY_LENGTH = 255;

const sha256 = (text: string): string => createHash('sha256').update(text).digest('hex');

/** Answers a repeated creation with what the first one answered, without creating again. */
export class Idempotency {
  private readonly database: Sequelize;

  constructor(database: Sequelize) {
    this.database = database;
    IdempotencyKeyModel.register(database);
  }

  /**
   * Handles the call, or answers what it answered before under the same key. Key, work and answer are
   * stored in one transaction: a second request with the key waits for the first at the key's row.
   */
  async once(call: Call<Access, unknown, unknown>, row: Route): Promise<unknown> {
    const work = () => row.handle(call);
    const key = call.request.get('Idempotency-Key');
    if (key === undefined || !call.actor) return work();
    if (key === '' || key.length > MAX_KEY_LENGTH) {
      throw new InvalidError({
        path: 'Idempotency-Key',
        message: `Give 1 to ${MAX_KEY_LENGTH} characters, or leave the header out.`,
      });
    }
    const name = {
      accountId: call.actor.accountId,
      route: `${row.method} ${row.path}`,
      keyHash: sha256(key),
    };
    const bodyHash = sha256(JSON.stringify([call.request.path, call.actor.workshopId, call.body]));
    try {
      return await this.first(name, bodyHash, work);
    } catch (error) {
      if (!(error instanceof UniqueConstraintError)) throw error;
      const before = await IdempotencyKeyModel.findOne({ where: name });
      if (!before) throw error; // The work's own conflict, or its key was just forgotten.
      if (before.bodyHash !== bodyHash) throw new KeyReusedError();
      return before.answer;
    }
  }

  private first(
    name: { accountId: number; route: string; keyHash: string },
    bodyHash: string,
    work: () => unknown,
  ): Promise<unknown> {
    return inTransaction(this.database, async () => {
      const record = await IdempotencyKeyModel.create({ ...name, bodyHash, answer: null });
      const answer = await work();
      await record.update({ answer });
      return answer;
    });
  }

  /** Forgets keys after a day. */
  async forgetOld(): Promise<void> {
    await IdempotencyKeyModel.destroy({
      where: { createdAt: { [Op.lt]: new Date(Date.now() - KEPT_MS) } },
    });
  }
}
