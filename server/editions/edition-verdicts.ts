import type { DifferenceKind } from '../../shared/contracts/edition-differences.ts';
import type {
  ReceiverVerdicts,
  VerdictFigures,
  VerdictsRequest,
} from '../../shared/contracts/edition-verdicts.ts';
import type { Page } from '../../shared/contracts/paging.ts';
import {
  bareReceiver,
  type ReceiverDraft,
  type ReceiverQuery,
  type StoredReceiver,
} from '../../shared/contracts/receiver.ts';
import { bareSite, type StoredSite } from '../../shared/contracts/site.ts';
import type { StationRecord } from '../../shared/contracts/station-list.ts';
import type { Engine } from '../computing/engine.ts';
import type { BriefJudgement, ListAtSite } from '../computing/engine-tasks.ts';
import type { ListsAtSites } from '../computing/lists-at-sites.ts';
import type { Actor } from '../http/actor.ts';
import { OperationalError, UnavailableError } from '../http/errors.ts';
import type { EditionDifferences, KeptDifference } from './edition-differences.ts';
import type { EditionStations } from './edition-stations.ts';

/** What verdicts need of the other resources. */
export interface VerdictSources {
  readonly differences: Pick<EditionDifferences, 'compared' | 'between'>;
  readonly stations: Pick<EditionStations, 'named'>;
  readonly receivers: { list(actor: Actor, query: ReceiverQuery): Promise<Page<StoredReceiver>> };
  readonly sites: { get(actor: Actor, id: number): Promise<StoredSite> };
  readonly lists: Pick<ListsAtSites, 'find'>;
  readonly engine: Pick<Engine, 'run'>;
}

type Side = 'before' | 'after';

/** One of the two editions, at the site. */
interface Judged {
  readonly editionId: number;
  readonly list: ListAtSite;
  /** What became of the stations that differ, by their id. */
  readonly differing: ReadonlyMap<number, DifferenceKind[]>;
}

type Sides = Readonly<Record<Side, Judged>>;
type Cause = ReceiverVerdicts['causes'][number];
type Names = ReadonlyMap<number, StationRecord>;

const MAX_CAUSES = 10;
/** A change of the deficit that is worth a word. */
const CHANGE_DB = 1;

/** Judges receivers with two editions and says whose verdict is another, and by which stations. */
export class EditionVerdicts {
  private readonly sources: VerdictSources;

  constructor(sources: VerdictSources) {
    this.sources = sources;
  }

  async judge(
    actor: Actor,
    id: number,
    request: VerdictsRequest,
    signal?: AbortSignal,
  ): Promise<Page<ReceiverVerdicts>> {
    const { receivers } = this.sources;
    const { page, pageSize } = request;
    const sides = await this.open(actor, id, request);
    const found = await receivers.list(actor, { page, pageSize, search: '', sort: 'name' });
    const items: ReceiverVerdicts[] = [];
    for (const receiver of found.items) {
      if (signal?.aborted) throw new UnavailableError('The client left.');
      items.push(await this.judgeOne(actor, receiver, sides, request, signal));
    }
    return { items, total: found.total };
  }

  private async open(actor: Actor, id: number, request: VerdictsRequest): Promise<Sides> {
    const { differences, sites, lists } = this.sources;
    const compared = await differences.compared(actor, id, request.against);
    const site = bareSite.parse(await sites.get(actor, request.siteId));
    const { all } = await differences.between(compared);
    const side = async (which: Side): Promise<Judged> => {
      const editionId = compared[which].id;
      const list = await lists.find(actor, { site, editionId });
      return { editionId, list, differing: idsOf(all, which) };
    };
    return { before: await side('before'), after: await side('after') };
  }

  /** One receiver that cannot be judged says why; the others are judged all the same. */
  private async judgeOne(
    actor: Actor,
    stored: StoredReceiver,
    sides: Sides,
    { period }: VerdictsRequest,
    signal?: AbortSignal,
  ): Promise<ReceiverVerdicts> {
    const { engine } = this.sources;
    const named = { receiverId: stored.id, receiverName: stored.name };
    const receiver: ReceiverDraft = bareReceiver.parse(stored);
    const brief = async (side: Side) =>
      (
        await engine.run('judgeBriefly', { list: sides[side].list, period, receiver }, { signal })
      ).read();
    try {
      const judged = { before: await brief('before'), after: await brief('after') };
      return { ...named, ...(await this.compare(actor, sides, judged)), reason: null };
    } catch (error) {
      if (!(error instanceof OperationalError) || error instanceof UnavailableError) throw error;
      const nothing = { before: null, after: null, changed: false, causes: [] };
      return { ...named, ...nothing, reason: error.message };
    }
  }

  private async compare(
    actor: Actor,
    sides: Sides,
    judged: Readonly<Record<Side, BriefJudgement>>,
  ) {
    const before = await this.names(actor, sides.before, judged.before);
    const after = await this.names(actor, sides.after, judged.after);
    const isChanged =
      harmedSet(judged.before, before) !== harmedSet(judged.after, after) ||
      Math.abs(judged.after.verdict.deficitDb - judged.before.verdict.deficitDb) >= CHANGE_DB;
    const causes = [
      ...causesOf('before', sides.before, judged.before, before),
      ...causesOf('after', sides.after, judged.after, after),
    ];
    return {
      before: figuresOf(judged.before, before),
      after: figuresOf(judged.after, after),
      changed: isChanged,
      causes: causes.sort(byHarm).slice(0, MAX_CAUSES),
    };
  }

  /** Names of all stations that a verdict speaks of. */
  private async names(
    actor: Actor,
    { editionId, differing }: Judged,
    { verdict, harm }: BriefJudgement,
  ): Promise<Names> {
    const ids = new Set(verdict.harmed.map(({ station }) => station));
    if (verdict.emptyDial) ids.add(verdict.emptyDial.station);
    for (const { stations } of harm) {
      for (const id of stations) if (differing.has(id)) ids.add(id);
    }
    const found = await this.sources.stations.named(actor, editionId, [...ids]);
    return new Map(found.map((station) => [station.id, station]));
  }
}

function idsOf(all: readonly KeptDifference[], side: Side): ReadonlyMap<number, DifferenceKind[]> {
  const key = side === 'before' ? 'beforeId' : 'afterId';
  return new Map(all.flatMap((each) => (each[key] === null ? [] : [[each[key], each.kinds]])));
}

/** Whoever harms a station stands before what is heard on an empty dial. */
const byHarm = (one: Cause, other: Cause): number =>
  (one.ratioDb ?? Infinity) < (other.ratioDb ?? Infinity) ? -1 : 1;

/** Who is harmed, by what a station is called in both editions. */
const harmedSet = ({ verdict }: BriefJudgement, names: Names): string =>
  verdict.harmed
    .map(({ station }) => {
      const { callSign = '', name = '', frequencyHz = 0 } = names.get(station) ?? {};
      return `${frequencyHz} ${(callSign || name).toLowerCase()}`;
    })
    .sort()
    .join('\n');

/** Stations that differ and are heard where somebody is harmed, each at its worst setting. */
function causesOf(
  edition: Side,
  { differing }: Judged,
  { harm, verdict: { emptyDial } }: BriefJudgement,
  names: Names,
): Cause[] {
  const worst = new Map<number, { dialHz: number; ratioDb: number | null }>();
  if (emptyDial && differing.has(emptyDial.station)) {
    worst.set(emptyDial.station, { dialHz: emptyDial.dialHz, ratioDb: null });
  }
  for (const { dialHz, ratioDb, stations } of harm) {
    for (const id of stations) {
      if (!differing.has(id) || ratioDb >= (worst.get(id)?.ratioDb ?? Infinity)) continue;
      worst.set(id, { dialHz, ratioDb });
    }
  }
  return [...worst].map(([id, at]) => ({
    ...named(id, names),
    edition,
    kinds: differing.get(id) ?? [],
    ...at,
  }));
}

function figuresOf({ verdict }: BriefJudgement, names: Names): VerdictFigures {
  const [worst] = verdict.harmed;
  const { emptyDial } = verdict;
  return {
    usable: verdict.usable,
    harmed: verdict.harmed.length,
    deficitDb: verdict.deficitDb,
    worst: worst
      ? {
          ...named(worst.station, names),
          dialHz: worst.dialHz,
          ratioDb: worst.ratioDb,
          grade: worst.grade,
        }
      : null,
    emptyDial: emptyDial && {
      ...named(emptyDial.station, names),
      dialHz: emptyDial.dialHz,
      overNoiseDb: emptyDial.overNoiseDb,
    },
  };
}

function named(id: number, names: Names) {
  const { name = '', callSign = '', frequencyHz = 0 } = names.get(id) ?? {};
  return { id, name: name || callSign, frequencyHz };
}
