import type { Sequelize } from 'sequelize';

import type { Page } from '../../shared/contracts/paging.ts';
import {
  bareReceiver,
  type ReceiverChange,
  type ReceiverDraft,
  type ReceiverQuery,
  type StoredReceiver,
} from '../../shared/contracts/receiver.ts';
import { containing } from '../db/search.ts';
import { inTransaction } from '../db/transaction.ts';
import { type Actor, mayChange } from '../http/actor.ts';
import { ConflictError, ForbiddenError, NotFoundError } from '../http/errors.ts';
import { ReceiverModel } from './receiver-model.ts';

interface People {
  namesOf(accountIds: readonly number[]): Promise<ReadonlyMap<number, string>>;
}

const ORDER = {
  name: [['name', 'ASC'] as const, ['id', 'ASC'] as const],
  updated: [['updatedAt', 'DESC'] as const, ['id', 'DESC'] as const],
};

/** Keeps the receivers of workshops. A receiver of another workshop is not there. */
export class Receivers {
  private readonly database: Sequelize;
  private readonly people: People;

  constructor(database: Sequelize, people: People) {
    this.database = database;
    this.people = people;
    ReceiverModel.register(database);
  }

  async list(actor: Actor, query: ReceiverQuery): Promise<Page<StoredReceiver>> {
    const { rows, count } = await ReceiverModel.findAndCountAll({
      where: { workshopId: actor.workshopId, name: containing(query.search) },
      order: ORDER[query.sort].map(([column, way]): [string, string] => [column, way]),
      limit: query.pageSize,
      offset: (query.page - 1) * query.pageSize,
    });
    return { items: await this.present(actor, rows), total: count };
  }

  async get(actor: Actor, id: number): Promise<StoredReceiver> {
    return this.presentOne(actor, await load(actor, id));
  }

  async add(actor: Actor, draft: ReceiverDraft): Promise<StoredReceiver> {
    const row = await ReceiverModel.create({
      ...columns(draft),
      workshopId: actor.workshopId,
      ownerId: actor.accountId,
      version: 1,
    });
    return this.presentOne(actor, row);
  }

  /** Stores a change made from the version it names; any other version is a conflict. */
  async change(actor: Actor, id: number, change: ReceiverChange): Promise<StoredReceiver> {
    return inTransaction(this.database, async () => {
      const row = await loadToChange(actor, id);
      if (row.version !== change.version) {
        throw new ConflictError(
          'Somebody changed this receiver in the meantime. Look at both before you save.',
          'receiver-changed',
          { current: await this.presentOne(actor, row) },
        );
      }
      await row.update({ ...columns(bareReceiver.parse(change)), version: row.version + 1 });
      return this.presentOne(actor, row);
    });
  }

  async remove(actor: Actor, id: number): Promise<void> {
    await inTransaction(this.database, async () => (await loadToChange(actor, id)).destroy());
  }

  private async presentOne(actor: Actor, row: ReceiverModel): Promise<StoredReceiver> {
    return toReceiver(actor, row, await this.people.namesOf([row.ownerId]));
  }

  private async present(actor: Actor, rows: ReceiverModel[]): Promise<StoredReceiver[]> {
    const names = await this.people.namesOf(rows.map(({ ownerId }) => ownerId));
    return rows.map((row) => toReceiver(actor, row, names));
  }
}

const columns = (definition: ReceiverDraft) => ({
  name: definition.name,
  ifHz: definition.ifHz,
  definition,
});

async function load({ workshopId }: Actor, id: number, lock = false): Promise<ReceiverModel> {
  const row = await ReceiverModel.findOne({ where: { id, workshopId }, lock });
  if (!row) throw new NotFoundError('receiver', id);
  return row;
}

async function loadToChange(actor: Actor, id: number): Promise<ReceiverModel> {
  const row = await load(actor, id, true);
  if (mayChange(actor, row.ownerId)) return row;
  throw new ForbiddenError('Only its owner or an admin may change this receiver.');
}

const toReceiver = (
  actor: Actor,
  { id, ownerId, definition, version, createdAt, updatedAt }: ReceiverModel,
  names: ReadonlyMap<number, string>,
): StoredReceiver => ({
  ...definition,
  id,
  version,
  ownerName: names.get(ownerId) ?? '',
  editable: mayChange(actor, ownerId),
  createdAt: createdAt.toISOString(),
  updatedAt: updatedAt.toISOString(),
});
