import type { AssessmentRequest } from '../../shared/contracts/assessment.ts';
import {
  type BreakthroughHoursRequest,
  momentsOf,
} from '../../shared/contracts/breakthrough-hours.ts';
import type { CandidatesRequest } from '../../shared/contracts/candidates.ts';
import { receptionTimeOf } from '../../shared/contracts/quantities.ts';
import type { Assessment } from '../../shared/radio/assessment/assessment.ts';
import type { BreakthroughHours } from '../../shared/radio/assessment/breakthrough-hours.ts';
import { CANDIDATE_ORDERS, type Candidates } from '../../shared/radio/candidates/candidates.ts';
import type { Computed, Engine } from '../computing/engine.ts';
import type { ListAtSite } from '../computing/engine-tasks.ts';
import type { ListRequest, ListsAtSites } from '../computing/lists-at-sites.ts';
import type { Actor } from '../http/actor.ts';

/** Judges receivers; stores nothing. */
export class Assessments {
  private readonly lists: Pick<ListsAtSites, 'find'>;
  private readonly engine: Pick<Engine, 'run'>;

  constructor(lists: Pick<ListsAtSites, 'find'>, engine: Pick<Engine, 'run'>) {
    this.lists = lists;
    this.engine = engine;
  }

  async assess(
    actor: Actor | undefined,
    request: AssessmentRequest,
    signal?: AbortSignal,
  ): Promise<Computed<Assessment>> {
    const list = await this.lists.find(actor, request);
    const { receiver, maxM, maxN, leaveOutBetterThan, limit } = request;
    const ask = { receiver, maxM, maxN, leaveOutBetterThan, limit };
    const time = receptionTimeOf(request.period);
    return this.engine.run(
      'assess',
      { list, time, skyWave: request.skyWave, ask },
      { signal, isVisitor: !actor },
    );
  }

  async breakthroughHours(
    actor: Actor | undefined,
    request: BreakthroughHoursRequest,
    signal?: AbortSignal,
  ): Promise<Computed<BreakthroughHours>> {
    const list = await this.lists.find(actor, request);
    const { receiver, date, skyWave } = request;
    const task = { list, receiver, skyWave, times: momentsOf(date, list.columns.count) };
    return this.engine.run('breakthroughHours', task, { signal, isVisitor: !actor });
  }

  async judgeCandidates(
    actor: Actor | undefined,
    request: CandidatesRequest,
    signal?: AbortSignal,
  ): Promise<Computed<Candidates>> {
    const lists: ListAtSite[] = [];
    for (const [path, each] of casesOf(request)) {
      lists.push(await this.lists.find(actor, each, path));
    }
    const { receiver, periods, fromHz, toHz, stepHz } = request;
    const ask = { receiver, periods, fromHz, toHz, stepHz, ...CANDIDATE_ORDERS };
    return this.engine.run('judgeCandidates', { lists, ask }, { signal, isVisitor: !actor });
  }
}

function casesOf({ cases, site, ...source }: CandidatesRequest): [string, ListRequest][] {
  if (site) return [['site', { ...source, site }]];
  return (cases ?? []).map((each, index) => [`cases.${index}.site`, each]);
}
