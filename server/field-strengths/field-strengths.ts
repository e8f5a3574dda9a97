import type {
  FieldStrengthsAnswer,
  FieldStrengthsRequest,
} from '../../shared/contracts/field-strengths.ts';
import type { Actor } from '../http/actor.ts';
import type { ListsAtSites } from './lists-at-sites.ts';

/** Answers how strong each station of a list is at a site. */
export class FieldStrengths {
  private readonly lists: Pick<ListsAtSites, 'find'>;

  constructor(lists: Pick<ListsAtSites, 'find'>) {
    this.lists = lists;
  }

  async compute(
    actor: Actor | undefined,
    request: FieldStrengthsRequest,
  ): Promise<FieldStrengthsAnswer> {
    const list = await this.lists.find(actor, request);
    const fields = list.fields(request.period).map((field, index) => ({
      ...field,
      name: list.stations[index]?.name ?? '',
      frequencyHz: list.stations[index]?.frequencyHz ?? 0,
    }));
    return { fields };
  }
}
