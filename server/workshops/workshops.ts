import type { Sequelize } from 'sequelize';

import type { Membership, Role } from '../../shared/contracts/session.ts';
import type { Workshop } from '../../shared/contracts/workshop.ts';
import type { Actor } from '../http/actor.ts';
import { NotFoundError } from '../http/errors.ts';
import { MembershipModel, WorkshopModel } from './workshop-models.ts';

/** Keeps workshops and who belongs to them. */
export class Workshops {
  constructor(database: Sequelize) {
    WorkshopModel.register(database);
    MembershipModel.register(database);
  }

  /** Makes an empty workshop. */
  async found(name: string): Promise<number> {
    return (await WorkshopModel.create({ name })).id;
  }

  async admit(accountId: number, workshopId: number, role: Role): Promise<void> {
    await MembershipModel.create({ accountId, workshopId, role });
  }

  /** The workshops of an account, its oldest first. */
  async membershipsOf(accountId: number): Promise<Membership[]> {
    const rows = await MembershipModel.findAll({
      where: { accountId },
      include: { model: WorkshopModel, as: 'workshop', required: true },
      order: [['workshopId', 'ASC']],
    });
    return rows.map(({ workshopId, role, workshop }) => ({
      id: workshopId,
      name: workshop?.name ?? '',
      role,
    }));
  }

  async nameOf(workshopId: number): Promise<string> {
    return (await WorkshopModel.findByPk(workshopId))?.name ?? '';
  }

  async get({ workshopId, role }: Actor): Promise<Workshop> {
    const row = await WorkshopModel.findByPk(workshopId);
    if (!row) throw new NotFoundError('workshop', workshopId);
    const members = await MembershipModel.count({ where: { workshopId } });
    return { id: row.id, name: row.name, role, members, createdAt: row.createdAt.toISOString() };
  }
}
