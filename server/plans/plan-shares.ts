import { createHash, randomBytes } from 'node:crypto';

import { Op, type Sequelize } from 'sequelize';

import type { PlanShare } from '../../shared/contracts/plan.ts';
import { inTransaction } from '../db/transaction.ts';
import type { Actor } from '../http/actor.ts';
import { OperationalError } from '../http/errors.ts';
import { PlanShareModel } from './plan-share-model.ts';

const SECRET_BYTES = 16;

/** One answer for links that never were and links that were ended. */
export class UnknownLinkError extends OperationalError {
  readonly status = 404;
  readonly type = 'shared-plan-not-found';

  constructor() {
    super('This link leads to no plan, or no longer does. Ask whoever sent it for a new one.');
  }
}

/** Keeps the links by which plans are read without signing in; knows only hashes of their secrets. */
export class PlanShares {
  private readonly database: Sequelize;

  constructor(database: Sequelize) {
    this.database = database;
    PlanShareModel.register(database);
  }

  /** Makes a link to a plan and ends the one there was. Its secret is told only now. */
  async begin(actor: Actor, planId: number): Promise<PlanShare> {
    const token = randomBytes(SECRET_BYTES).toString('base64url');
    const sharedAt = new Date();
    await inTransaction(this.database, async () => {
      await this.end(actor, planId);
      const { accountId: sharedBy, workshopId } = actor;
      const tokenHash = hashOf(token);
      await PlanShareModel.create({ planId, workshopId, tokenHash, sharedBy, sharedAt });
    });
    return { token, sharedAt: sharedAt.toISOString() };
  }

  async end({ accountId }: Actor, planId: number): Promise<void> {
    await PlanShareModel.update(
      { revokedBy: accountId, revokedAt: new Date() },
      { where: { planId, revokedAt: null } },
    );
  }

  /** The open link of each plan that has one. */
  async openOf(planIds: readonly number[]): Promise<ReadonlyMap<number, PlanShareModel>> {
    const rows = await PlanShareModel.findAll({
      where: { planId: { [Op.in]: [...planIds] }, revokedAt: null },
    });
    return new Map(rows.flatMap((row) => (row.planId === null ? [] : [[row.planId, row]])));
  }

  /** The plan that an open link leads to. */
  async find(token: string): Promise<{ planId: number; workshopId: number; sharedAt: Date }> {
    const row = await PlanShareModel.findOne({
      where: { tokenHash: hashOf(token), revokedAt: null },
    });
    if (typeof row?.planId !== 'number') throw new UnknownLinkError();
    return { planId: row.planId, workshopId: row.workshopId, sharedAt: row.sharedAt };
  }
}

const hashOf = (token: string): string => createHash('sha256').update(token).digest('base64url');
