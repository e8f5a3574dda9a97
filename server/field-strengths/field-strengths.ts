import type { FieldStrengthsRequest } from '../../shared/contracts/field-strengths.ts';
import { receptionTimeOf } from '../../shared/contracts/quantities.ts';
import type { Computed, Engine } from '../computing/engine.ts';
import type { Tasks } from '../computing/engine-tasks.ts';
import type { ListsAtSites } from '../computing/lists-at-sites.ts';
import type { Actor } from '../http/actor.ts';

/** Answers how strong each station of a list is at a site. */
export class FieldStrengths {
  private readonly lists: Pick<ListsAtSites, 'find'>;
  private readonly engine: Pick<Engine, 'run'>;

  constructor(lists: Pick<ListsAtSites, 'find'>, engine: Pick<Engine, 'run'>) {
    this.lists = lists;
    this.engine = engine;
  }

  async compute(
    actor: Actor | undefined,
    request: FieldStrengthsRequest,
    signal?: AbortSignal,
  ): Promise<Computed<Tasks['fieldStrengths']['answers']>> {
    const list = await this.lists.find(actor, request);
    const time = receptionTimeOf(request.period);
    return this.engine.run(
      'fieldStrengths',
      { list, time, skyWave: request.skyWave },
      { signal, isVisitor: !actor },
    );
  }
}
