import type { Sequelize } from 'sequelize';

import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import type { Plan, PlanDraft } from '../../shared/contracts/plan.ts';
import { bareReceiver, type StoredReceiver } from '../../shared/contracts/receiver.ts';
import type { Edition } from '../../shared/contracts/region.ts';
import { bareSite, type StoredSite } from '../../shared/contracts/site.ts';
import { type Actor, mayChange } from '../http/actor.ts';
import { ForbiddenError, NotFoundError } from '../http/errors.ts';
import { type Judge, judgePlan } from './judge-plan.ts';
import { PlanModel } from './plan-model.ts';

/** What the plans need of the other resources. */
export interface PlanSources {
  readonly receivers: { get(actor: Actor, id: number): Promise<StoredReceiver> };
  readonly sites: { get(actor: Actor, id: number): Promise<StoredSite> };
  readonly editions: { get(actor: Actor, id: number): Promise<Edition> };
  readonly assessments: Judge;
  readonly people: { namesOf(ids: readonly number[]): Promise<ReadonlyMap<number, string>> };
}

/** Keeps plans: a receiver judged at one site against one list, with a chosen IF. */
export class Plans {
  private readonly sources: PlanSources;

  constructor(database: Sequelize, sources: PlanSources) {
    this.sources = sources;
    PlanModel.register(database);
  }

  async list(actor: Actor, receiverId: number, query: PageQuery): Promise<Page<Plan>> {
    await this.sources.receivers.get(actor, receiverId);
    const { rows, count } = await PlanModel.findAndCountAll({
      where: { receiverId },
      order: [
        ['createdAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: query.pageSize,
      offset: (query.page - 1) * query.pageSize,
    });
    return { items: await this.present(actor, rows), total: count };
  }

  async get(actor: Actor, receiverId: number, id: number): Promise<Plan> {
    return this.presentOne(actor, await this.load(actor, receiverId, id));
  }

  /** Judges the receiver with its present and the chosen IF, and keeps everything as it is now. */
  async keep(actor: Actor, receiverId: number, draft: PlanDraft): Promise<Plan> {
    const { receivers, sites, editions, assessments } = this.sources;
    const receiver = bareReceiver.parse(await receivers.get(actor, receiverId));
    const { name: siteName, ...place } = await sites.get(actor, draft.siteId);
    const site = bareSite.parse(place);
    const edition = draft.editionId === null ? null : await editions.get(actor, draft.editionId);
    const results = await judgePlan(assessments, actor, { receiver, site, draft });
    const row = await PlanModel.create({
      receiverId,
      ownerId: actor.accountId,
      siteId: draft.siteId,
      editionId: draft.editionId,
      name: draft.name,
      ifHz: draft.ifHz,
      snapshot: {
        note: draft.note,
        period: draft.period,
        siteName,
        site,
        editionLabel: edition?.label ?? null,
        everyChannelDb: draft.everyChannelDb,
        receiver,
        results,
      },
    });
    return this.presentOne(actor, row);
  }

  async remove(actor: Actor, receiverId: number, id: number): Promise<void> {
    const row = await this.load(actor, receiverId, id);
    if (!mayChange(actor, row.ownerId)) {
      throw new ForbiddenError('Only who kept this plan or an admin may delete it.');
    }
    await row.destroy();
  }

  private async load(actor: Actor, receiverId: number, id: number): Promise<PlanModel> {
    await this.sources.receivers.get(actor, receiverId);
    const row = await PlanModel.findOne({ where: { id, receiverId } });
    if (!row) throw new NotFoundError('plan', id);
    return row;
  }

  private async presentOne(actor: Actor, row: PlanModel): Promise<Plan> {
    return toPlan(actor, row, await this.sources.people.namesOf([row.ownerId]));
  }

  private async present(actor: Actor, rows: readonly PlanModel[]): Promise<Plan[]> {
    const names = await this.sources.people.namesOf(rows.map(({ ownerId }) => ownerId));
    return rows.map((row) => toPlan(actor, row, names));
  }
}

const toPlan = (actor: Actor, row: PlanModel, names: ReadonlyMap<number, string>): Plan => ({
  ...row.snapshot,
  id: row.id,
  receiverId: row.receiverId,
  name: row.name,
  ifHz: row.ifHz,
  siteId: row.siteId,
  editionId: row.editionId,
  keptBy: names.get(row.ownerId) ?? '',
  keptAt: row.createdAt.toISOString(),
  editable: mayChange(actor, row.ownerId),
});
