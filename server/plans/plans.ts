import type { Sequelize } from 'sequelize';

import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import type {
  Plan,
  PlanDraft,
  PlanShare,
  PlanStation,
  SharedPlan,
  WholePlan,
} from '../../shared/contracts/plan.ts';
import { bareReceiver, type StoredReceiver } from '../../shared/contracts/receiver.ts';
import type { Edition } from '../../shared/contracts/region.ts';
import { bareSite, type SiteDraft, type StoredSite } from '../../shared/contracts/site.ts';
import { stationsOnEveryChannel } from '../../shared/radio/channels/assumed-stations.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import { inTransaction } from '../db/transaction.ts';
import { type Actor, mayChange } from '../http/actor.ts';
import { ConflictError, ForbiddenError, NotFoundError } from '../http/errors.ts';
import { type Judge, judgePlan } from './judge-plan.ts';
import { PlanModel } from './plan-model.ts';
import { type PlanSurroundings, toPlan, toSharedPlan, toWholePlan } from './plan-presenter.ts';
import { type PlanShares, UnknownLinkError } from './plan-shares.ts';
import { byPlaceIn, stationsIn } from './plan-stations.ts';

/** As many sites and editions as a workshop can have any use for at once. */
const ALL = { page: 1, pageSize: 500 };

/** What the plans need of the other resources. */
export interface PlanSources {
  readonly receivers: { get(actor: Actor, id: number): Promise<StoredReceiver> };
  readonly sites: {
    get(actor: Actor, id: number): Promise<StoredSite>;
    list(actor: Actor, query: PageQuery & { search: string }): Promise<Page<StoredSite>>;
  };
  readonly editions: {
    get(actor: Actor, id: number): Promise<Edition>;
    list(actor: Actor, query: PageQuery): Promise<Page<Edition>>;
  };
  readonly stations: {
    named(
      actor: Actor,
      editionId: number,
      ids: readonly number[],
    ): Promise<(PlanStation & { id: number })[]>;
    computedWith(actor: Actor, editionId: number): Promise<{ readonly version: string }>;
  };
  readonly assessments: Judge;
  readonly workshops: { nameOf(id: number): Promise<string> };
  readonly people: { namesOf(ids: readonly number[]): Promise<ReadonlyMap<number, string>> };
}

/** Keeps plans: a receiver judged at one site against one list, with a chosen IF. */
export class Plans {
  private readonly database: Sequelize;
  private readonly shares: PlanShares;
  private readonly sources: PlanSources;

  constructor(database: Sequelize, shares: PlanShares, sources: PlanSources) {
    this.database = database;
    this.shares = shares;
    this.sources = sources;
    PlanModel.register(database);
  }

  async list(actor: Actor, receiverId: number, query: PageQuery): Promise<Page<Plan>> {
    const receiver = await this.sources.receivers.get(actor, receiverId);
    const { rows, count } = await PlanModel.findAndCountAll({
      attributes: { exclude: ['working'] },
      where: { receiverId },
      order: [
        ['createdAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: query.pageSize,
      offset: (query.page - 1) * query.pageSize,
    });
    const around = await this.surroundings(actor, receiver, rows);
    return { items: rows.map((row) => toPlan(actor, row, around)), total: count };
  }

  async get(actor: Actor, receiverId: number, id: number): Promise<WholePlan> {
    const { row, receiver } = await this.load(actor, receiverId, id);
    return toWholePlan(actor, row, await this.surroundings(actor, receiver, [row]));
  }

  /** Judges the receiver with its present and the chosen IF, and keeps everything as it is now. */
  async keep(actor: Actor, receiverId: number, draft: PlanDraft): Promise<WholePlan> {
    const { receivers, sites, editions, stations, assessments } = this.sources;
    const receiver = await receivers.get(actor, receiverId);
    const saved = bareReceiver.parse(receiver);
    const { name: siteName, ...place } = await sites.get(actor, draft.siteId);
    const site = bareSite.parse(place);
    const edition = draft.editionId === null ? null : await editions.get(actor, draft.editionId);
    const listed = edition && (await stations.computedWith(actor, edition.id));
    const found = await judgePlan(assessments, actor, { saved, site, draft });
    const ids = stationsIn(found);
    const { results, judged } = byPlaceIn(ids, found);
    const row = await PlanModel.create({
      ...{ receiverId, ownerId: actor.accountId, siteId: draft.siteId },
      ...{ editionId: draft.editionId, name: draft.name, ifHz: draft.ifHz },
      snapshot: {
        ...{ note: draft.note, period: draft.period, siteName, site },
        ...{ everyChannelDb: draft.everyChannelDb, ...editionFields(edition) },
        receiver: draft.receiver ?? saved,
        savedReceiver: draft.receiver && saved,
        results,
        ...(listed && { listVersion: listed.version }),
      },
      working: { stations: await this.stations(actor, site, draft, ids), judged },
    });
    return toWholePlan(actor, row, await this.surroundings(actor, receiver, [row]));
  }

  async remove(actor: Actor, receiverId: number, id: number): Promise<void> {
    const { row } = await this.loadToChange(actor, receiverId, id, 'delete');
    await inTransaction(this.database, async () => {
      await this.shares.end(actor, row.id);
      await row.destroy();
    });
  }

  /** Makes a link by which anyone can read the plan; the one before it ends. */
  async share(actor: Actor, receiverId: number, id: number): Promise<PlanShare> {
    return inTransaction(this.database, async () => {
      const { row } = await this.loadToChange(actor, receiverId, id, 'share');
      if (row.working === null) {
        throw new ConflictError(
          'This plan was kept before plans held their stations. Judge it again and share the new one.',
          'plan-without-working',
        );
      }
      return this.shares.begin(actor, row.id);
    });
  }

  async unshare(actor: Actor, receiverId: number, id: number): Promise<void> {
    const { row } = await this.loadToChange(actor, receiverId, id, 'share');
    await this.shares.end(actor, row.id);
  }

  /** The plan behind a link, for whoever has the link. */
  async readShared(token: string): Promise<SharedPlan> {
    const { planId, workshopId, sharedAt } = await this.shares.find(token);
    const row = await PlanModel.findByPk(planId);
    if (!row) throw new UnknownLinkError();
    const workshopName = await this.sources.workshops.nameOf(workshopId);
    return toSharedPlan(row, { workshopName, sharedAt: sharedAt.toISOString() });
  }

  private async load(actor: Actor, receiverId: number, id: number, lock = false) {
    const receiver = await this.sources.receivers.get(actor, receiverId);
    const row = await PlanModel.findOne({ where: { id, receiverId }, lock });
    if (!row) throw new NotFoundError('plan', id);
    return { row, receiver };
  }

  private async loadToChange(
    actor: Actor,
    receiverId: number,
    id: number,
    what: 'delete' | 'share',
  ) {
    const found = await this.load(actor, receiverId, id, what === 'share');
    if (mayChange(actor, found.row.ownerId)) return found;
    throw new ForbiddenError(`Only who kept this plan or an admin may ${what} it.`);
  }

  /** The stations a plan names, in the order of their ids. */
  private async stations(
    actor: Actor,
    site: SiteDraft,
    { editionId, everyChannelDb }: PlanDraft,
    ids: readonly number[],
  ): Promise<PlanStation[]> {
    const list =
      editionId === null
        ? stationsOnEveryChannel(defaultRaster(site.ituRegion), everyChannelDb ?? 0)
        : await this.sources.stations.named(actor, editionId, ids);
    const byId = new Map<number, { name: string; frequencyHz: number; callSign?: string }>(
      list.map((each) => [each.id, each]),
    );
    return ids.map((id) => {
      const { name = '', callSign = '', frequencyHz = 0 } = byId.get(id) ?? {};
      return { name, callSign, frequencyHz };
    });
  }

  /** Of the editions that are still there: an import may have been undone. */
  private async listVersions(
    actor: Actor,
    rows: readonly PlanModel[],
    editions: readonly Edition[],
  ): Promise<ReadonlyMap<number, string>> {
    const versions = new Map<number, string>();
    const named = new Set(rows.map(({ editionId }) => editionId));
    for (const { id } of editions.filter((each) => named.has(each.id))) {
      versions.set(id, (await this.sources.stations.computedWith(actor, id)).version);
    }
    return versions;
  }

  private async surroundings(
    actor: Actor,
    receiver: StoredReceiver,
    rows: readonly PlanModel[],
  ): Promise<PlanSurroundings> {
    const { sites, editions, people } = this.sources;
    const shares = await this.shares.openOf(rows.map(({ id }) => id));
    const sharers = [...shares.values()].map(({ sharedBy }) => sharedBy);
    const { items } = await sites.list(actor, { ...ALL, search: '' });
    const { items: present } = await editions.list(actor, ALL);
    return {
      present: {
        receiver,
        sites: new Map(items.map((each) => [each.id, each])),
        editions: present,
        listVersions: await this.listVersions(actor, rows, present),
      },
      names: await people.namesOf([...rows.map(({ ownerId }) => ownerId), ...sharers]),
      shares,
    };
  }
}

function editionFields(edition: Edition | null) {
  if (!edition) return { editionLabel: null, edition: null, regionId: null };
  const { label, date, source, regionName, regionId, stations } = edition;
  return { editionLabel: label, edition: { label, date, source, regionName, stations }, regionId };
}
