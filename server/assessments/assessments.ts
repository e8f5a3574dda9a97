import type { AssessmentRequest } from '../../shared/contracts/assessment.ts';
import type { CandidatesRequest } from '../../shared/contracts/candidates.ts';
import { type Assessment, assess } from '../../shared/radio/assessment.ts';
import { type Candidates, judgeCandidates } from '../../shared/radio/candidates.ts';
import type { ListAtSite, ListRequest } from '../field-strengths/lists-at-sites.ts';
import type { Actor } from '../http/actor.ts';
import { InvalidError } from '../http/errors.ts';
import { refuseNotYet } from './not-yet.ts';

/** What is needed of the lists. */
interface ListFinder {
  find(actor: Actor | undefined, request: ListRequest, path?: string): Promise<ListAtSite>;
}

/** Orders of products that candidates are judged by. */
const CANDIDATE_ORDERS = { maxM: 3, maxN: 2 } as const;

/** Judges receivers; stores nothing. */
export class Assessments {
  private readonly lists: ListFinder;

  constructor(lists: ListFinder) {
    this.lists = lists;
  }

  async assess(actor: Actor | undefined, request: AssessmentRequest): Promise<Assessment> {
    refuseNotYet(request);
    const list = await this.lists.find(actor, request);
    return assess({ ...request, ...list, fields: list.fields(request.period) });
  }

  async judgeCandidates(actor: Actor | undefined, request: CandidatesRequest): Promise<Candidates> {
    refuseNotYet(request);
    refuseZeroOscillator(request);
    const lists: ListAtSite[] = [];
    for (const [path, each] of casesOf(request)) {
      lists.push(await this.lists.find(actor, each, path));
    }
    const cases = lists.map(({ site, stations, raster, fields }) => ({
      site,
      stations,
      raster,
      fields: Object.fromEntries(request.periods.map((period) => [period, fields(period)])),
    }));
    return judgeCandidates({ ...request, ...CANDIDATE_ORDERS, cases });
  }
}

/** A band whose oscillator runs below needs every candidate below the band. */
function refuseZeroOscillator({ receiver, toHz }: CandidatesRequest): void {
  const band = receiver.bands.find((each) => each.oscillator === 'below' && each.lowHz <= toHz);
  if (!band) return;
  throw new InvalidError({
    path: 'toHz',
    message: `The oscillator of band "${band.name}" would reach zero: end below ${band.lowHz} Hz.`,
  });
}

function casesOf({ cases, site, ...source }: CandidatesRequest): [string, ListRequest][] {
  if (site) return [['site', { ...source, site }]];
  return (cases ?? []).map((each, index) => [`cases.${index}.site`, each]);
}
