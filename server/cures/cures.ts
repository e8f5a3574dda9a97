import type { CuresRequest } from '../../shared/contracts/cures.ts';
import { CANDIDATE_ORDERS } from '../../shared/radio/candidates/candidates.ts';
import type { Cures as AllCures } from '../../shared/radio/cures/cures.ts';
import type { Computed, Engine } from '../computing/engine.ts';
import type { ListsAtSites } from '../computing/lists-at-sites.ts';
import type { Actor } from '../http/actor.ts';

/** Answers what can be done about what a receiver lets through. */
export class Cures {
  private readonly lists: Pick<ListsAtSites, 'find'>;
  private readonly engine: Pick<Engine, 'run'>;

  constructor(lists: Pick<ListsAtSites, 'find'>, engine: Pick<Engine, 'run'>) {
    this.lists = lists;
    this.engine = engine;
  }

  async find(
    actor: Actor | undefined,
    request: CuresRequest,
    signal?: AbortSignal,
  ): Promise<Computed<AllCures>> {
    const list = await this.lists.find(actor, request);
    const { receiver, periods } = request;
    return this.engine.run(
      'findCures',
      { list, ask: { receiver, periods, ...CANDIDATE_ORDERS } },
      { signal, isVisitor: !actor },
    );
  }
}
