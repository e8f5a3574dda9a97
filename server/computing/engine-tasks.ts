import {
  type Assessment,
  type AssessmentInput,
  assess as assessReceiver,
} from '../../shared/radio/assessment/assessment.ts';
import {
  breakthroughHours as hoursOfBreakthrough,
  type BreakthroughHours,
} from '../../shared/radio/assessment/breakthrough-hours.ts';
import {
  CANDIDATE_ORDERS,
  type CandidateCase,
  type Candidates,
  type CandidatesInput,
  judgeCandidates as judge,
} from '../../shared/radio/candidates/candidates.ts';
import type { CuresInput } from '../../shared/radio/cures/cure-bench.ts';
import { type Cures, findCures as findAllCures } from '../../shared/radio/cures/cures.ts';
import {
  type FieldStrength,
  fieldStrengths as compute,
} from '../../shared/radio/propagation/field-strength.ts';
import type { DialTotal } from '../../shared/radio/assessment/dial-totals.ts';
import type { Verdict } from '../../shared/radio/assessment/verdict.ts';
import type { Period, ReceptionTime, Site } from '../../shared/radio/site.ts';
import { type SkyWaveChoice, USUAL_SKY_WAVE } from '../../shared/radio/propagation/sky-wave.ts';
import type { RasterRange, Station } from '../../shared/radio/station.ts';
import { periodAt } from '../../shared/radio/propagation/sunlight.ts';
import type { Tracking, TrackingInput } from '../../shared/radio/tracking/tracking.ts';
import {
  whistleCauses,
  type WhistleInput,
  type Whistles,
} from '../../shared/radio/whistles/whistle-causes.ts';
import { BoundedCache } from './bounded-cache.ts';
import { placeKey } from './list-key.ts';
import { keptColumns, keptFields, type SharedFields } from './shared-fields.ts';
import { pickAmong, type PickedStations, type StationPick } from './station-picking.ts';
import { type StationColumns, unpackNames, unpackStations } from './station-columns.ts';

/** The stations of a request and the site they are received at. */
export interface ListAtSite {
  readonly site: Site;
  readonly raster: readonly RasterRange[];
  readonly columns: StationColumns;
  /** Names what is on the list, so that what comes of it can be kept; null for one that was sent. */
  readonly content: string | null;
  /** Fields by day and at night with the usual sky wave, for all threads; null for a sent list. */
  readonly kept: Readonly<Record<Period, SharedFields>> | null;
}

type FromList = 'site' | 'stations' | 'fields' | 'raster';
/** What the thread adds by itself; it throws when nobody waits for the answer any more. */
type Checkpoint = () => void;

/** What each computation takes and answers. */
export interface Tasks {
  assess: {
    takes: {
      readonly list: ListAtSite;
      readonly time: ReceptionTime;
      readonly skyWave: SkyWaveChoice;
      readonly ask: Omit<AssessmentInput, FromList | 'period' | 'checkpoint'>;
    };
    answers: Assessment;
  };
  judgeCandidates: {
    takes: {
      readonly lists: readonly ListAtSite[];
      readonly ask: Omit<CandidatesInput, 'cases' | 'checkpoint'>;
    };
    answers: Candidates;
  };
  findCures: {
    takes: { readonly list: ListAtSite; readonly ask: Omit<CuresInput, FromList | 'checkpoint'> };
    answers: Cures;
  };
  breakthroughHours: {
    takes: {
      readonly list: ListAtSite;
      readonly receiver: AssessmentInput['receiver'];
      readonly times: readonly Date[];
      readonly skyWave: SkyWaveChoice;
    };
    answers: BreakthroughHours;
  };
  fieldStrengths: {
    takes: {
      readonly list: ListAtSite;
      readonly time: ReceptionTime;
      readonly skyWave: SkyWaveChoice;
    };
    answers: { readonly fields: readonly (FieldStrength & Named)[] };
  };
  judgeBriefly: {
    takes: {
      readonly list: ListAtSite;
      readonly period: Period;
      readonly receiver: AssessmentInput['receiver'];
    };
    answers: BriefJudgement;
  };
  pickStations: { takes: StationPick; answers: PickedStations };
  designTracking: { takes: TrackingInput; answers: Tracking };
  explainWhistle: {
    takes: {
      readonly list: ListAtSite;
      readonly time: ReceptionTime;
      readonly ask: Omit<WhistleInput, FromList>;
    };
    answers: Whistles & { readonly skipped: readonly Skipped[] };
  };
}

/** A verdict, and by which stations it comes about. */
export interface BriefJudgement {
  readonly verdict: Verdict;
  /** What is heard at the settings where a station is harmed. */
  readonly harm: readonly Pick<DialTotal, 'dialHz' | 'ratioDb' | 'stations'>[];
}

interface Named {
  readonly name: string;
  readonly frequencyHz: number;
  readonly latitude: number | null;
  readonly longitude: number | null;
}

interface Skipped {
  readonly station: number;
  readonly reason: string;
}

const KEPT_STATIONS = 150_000;
const KEPT_FIELDS = 150_000;

/** This thread's own and small: there may be many threads, and any can make the same again. */
const unpacked = new BoundedCache<Station[]>(KEPT_STATIONS);
/** Fields at a moment, or of a sky wave that is not the usual one. */
const unusual = new BoundedCache<FieldStrength[]>(KEPT_FIELDS);

export function assess(
  { list, time, skyWave, ask }: Tasks['assess']['takes'],
  checkpoint: Checkpoint,
): Assessment {
  const { site, raster } = list;
  const stations = stationsOf(list);
  const fields = fieldsOf(list, time, skyWave);
  return assessReceiver({
    ...ask,
    checkpoint,
    site,
    raster,
    stations,
    fields,
    period: periodOf(site, time),
  });
}

/** The verdict as an assessment gives it, without the responses. */
export function judgeBriefly(
  { list, period, receiver }: Tasks['judgeBriefly']['takes'],
  checkpoint: Checkpoint,
): BriefJudgement {
  const ask = {
    receiver,
    ...CANDIDATE_ORDERS,
    leaveOutBetterThan: 'very-annoying' as const,
    limit: 1,
  };
  const { verdict, bands } = assess(
    { list, time: period, skyWave: USUAL_SKY_WAVE, ask },
    checkpoint,
  );
  const harmed = new Set(verdict.harmed.map(({ dialHz }) => dialHz));
  const harm = bands
    .flatMap(({ totals }) => totals)
    .filter(({ dialHz }) => harmed.has(dialHz))
    .map(({ dialHz, ratioDb, stations }) => ({ dialHz, ratioDb, stations }));
  return { verdict, harm };
}

export function pickStations(pick: StationPick): PickedStations {
  const { list, period } = pick;
  const make = () => compute(list.site, stationsOf(list), period);
  if (!list.kept) throw new RangeError('list: stations are picked from an edition only');
  return pickAmong(pick, keptColumns(list.kept[period], make));
}

export function judgeCandidates(
  { lists, ask }: Tasks['judgeCandidates']['takes'],
  checkpoint: Checkpoint,
): Candidates {
  return judge({ ...ask, checkpoint, cases: lists.map((list) => caseOf(list, ask.periods)) });
}

export function findCures(
  { list, ask }: Tasks['findCures']['takes'],
  checkpoint: Checkpoint,
): Cures {
  return findAllCures({ ...ask, checkpoint, ...caseOf(list, ask.periods) });
}

export function breakthroughHours(
  { list, ...asked }: Tasks['breakthroughHours']['takes'],
  checkpoint: Checkpoint,
): BreakthroughHours {
  const { site, raster } = list;
  return hoursOfBreakthrough({ ...asked, checkpoint, site, raster, stations: stationsOf(list) });
}

export function fieldStrengths({
  list,
  time,
  skyWave,
}: Tasks['fieldStrengths']['takes']): Tasks['fieldStrengths']['answers'] {
  const stations = stationsOf(list);
  const names = unpackNames(list.columns);
  const fields = fieldsOf(list, time, skyWave).map((field, index) => ({
    ...field,
    name: names[index] ?? '',
    frequencyHz: stations[index]?.frequencyHz ?? 0,
    latitude: stations[index]?.latitude ?? null,
    longitude: stations[index]?.longitude ?? null,
  }));
  return { fields };
}

export function explainWhistle({
  list,
  time,
  ask,
}: Tasks['explainWhistle']['takes']): Tasks['explainWhistle']['answers'] {
  const { site, raster } = list;
  const fields = fieldsOf(list, time);
  const skipped = fields
    .filter(({ fieldDb }) => fieldDb === null)
    .map(({ station, notes }) => ({ station, reason: notes.join(' ') }));
  return {
    ...whistleCauses({ ...ask, site, raster, stations: stationsOf(list), fields }),
    skipped,
  };
}

function caseOf(list: ListAtSite, periods: readonly Period[]): CandidateCase {
  return {
    site: list.site,
    raster: list.raster,
    stations: stationsOf(list),
    fields: Object.fromEntries(periods.map((period) => [period, fieldsOf(list, period)])),
  };
}

function stationsOf({ content, columns }: ListAtSite): Station[] {
  if (content === null) return unpackStations(columns);
  return unpacked.remember(content, columns.count, () => unpackStations(columns));
}

function fieldsOf(
  list: ListAtSite,
  time: ReceptionTime,
  skyWave: SkyWaveChoice = USUAL_SKY_WAVE,
): FieldStrength[] {
  const { content, kept, site, columns } = list;
  const make = () => compute(site, stationsOf(list), time, skyWave);
  if (content === null || kept === null) return make();
  if (typeof time === 'string' && isUsual(skyWave)) {
    return keptFields(kept[time], stationsOf(list), make);
  }
  const when = time instanceof Date ? time.toISOString() : time;
  const key = [placeKey(content, site), when, skyWave.form, skyWave.nights].join();
  return unusual.remember(key, columns.count, make);
}

const isUsual = ({ form, nights }: SkyWaveChoice): boolean =>
  form === USUAL_SKY_WAVE.form && nights === USUAL_SKY_WAVE.nights;

/** Day or night at the site; one without a place has fields given, the same at any time. */
function periodOf({ latitude, longitude }: Site, time: ReceptionTime): Period {
  if (!(time instanceof Date)) return time;
  if (latitude === null || longitude === null) return 'night';
  return periodAt({ latitude, longitude }, time);
}
