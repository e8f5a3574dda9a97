import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import type { Member } from '../../shared/contracts/workshop.ts';
import type { Actor } from '../http/actor.ts';
import { MembershipModel } from './workshop-models.ts';

interface People {
  namesOf(accountIds: readonly number[]): Promise<ReadonlyMap<number, string>>;
}

/** The people of a workshop. */
export class Members {
  private readonly people: People;

  constructor(people: People) {
    this.people = people;
  }

  async list({ workshopId }: Actor, { page, pageSize }: PageQuery): Promise<Page<Member>> {
    const { rows, count } = await MembershipModel.findAndCountAll({
      where: { workshopId },
      order: [['accountId', 'ASC']],
      limit: pageSize,
      offset: (page - 1) * pageSize,
    });
    const names = await this.people.namesOf(rows.map(({ accountId }) => accountId));
    const items = rows.map(({ accountId, role, createdAt }) => ({
      id: accountId,
      name: names.get(accountId) ?? '',
      role,
      since: createdAt.toISOString(),
    }));
    return { items, total: count };
  }
}
