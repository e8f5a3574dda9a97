import { receptionTimeOf } from '../../shared/contracts/quantities.ts';
import type { WhistlesRequest } from '../../shared/contracts/whistles.ts';
import type { Computed, Engine } from '../computing/engine.ts';
import type { Tasks } from '../computing/engine-tasks.ts';
import type { ListsAtSites } from '../computing/lists-at-sites.ts';
import type { Actor } from '../http/actor.ts';

/** Answers what may whistle at a dial setting. */
export class Whistles {
  private readonly lists: Pick<ListsAtSites, 'find'>;
  private readonly engine: Pick<Engine, 'run'>;

  constructor(lists: Pick<ListsAtSites, 'find'>, engine: Pick<Engine, 'run'>) {
    this.lists = lists;
    this.engine = engine;
  }

  async explain(
    actor: Actor | undefined,
    request: WhistlesRequest,
    signal?: AbortSignal,
  ): Promise<Computed<Tasks['explainWhistle']['answers']>> {
    const list = await this.lists.find(actor, request);
    const { receiver, dialHz, pitchHz = null, pitchSlope = null } = request;
    const ask = { receiver, dialHz, pitchHz, pitchSlope };
    const time = receptionTimeOf(request.period);
    return this.engine.run('explainWhistle', { list, time, ask }, { signal, isVisitor: !actor });
  }
}
