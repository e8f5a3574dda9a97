import { hash } from 'node:crypto';

import type { StationRecord } from '../../shared/contracts/station-list.ts';
import type { CorrectionModel } from './correction-model.ts';

/** A correction as far as applying it goes. */
export type AppliedCorrection = Pick<
  CorrectionModel,
  'id' | 'kind' | 'identity' | 'station' | 'fields' | 'note' | 'date' | 'authorId' | 'updatedAt'
>;

/** A station of an edition with what was corrected of it. */
export interface CorrectedStation {
  readonly record: StationRecord;
  readonly offAir: boolean;
  /** By date, the latest last. */
  readonly corrections: readonly AppliedCorrection[];
}

/** What hand-made corrections make of one edition. */
export interface CorrectedList {
  /** By station id: what stands in place of the edition's own, and what was added. */
  readonly stations: ReadonlyMap<number, CorrectedStation>;
  /** Station of each correction in this edition; without an entry it has none there. */
  readonly stationOf: ReadonlyMap<number, number>;
  /** Equal where computing gets the same stations. */
  readonly version: string;
  /** Equal where lists show the same. */
  readonly state: string;
}

/** An official station that a correction may be about. */
export interface Listed {
  readonly identity: string;
  readonly record: StationRecord;
}

const HIGHEST_ID = 4_294_967_295;
const LOWEST_ADDED = 4_000_000_000;

/** Added stations are numbered from the top down, imported ones from the bottom up. */
export const addedStationId = (correctionId: number): number => HIGHEST_ID - correctionId;

export const isAdded = (stationId: number): boolean => stationId >= LOWEST_ADDED;

/** Correction by which a station was added. */
export const correctionOfAdded = (stationId: number): number => HIGHEST_ID - stationId;

/** By what a tick names the station that a correction added. */
export const addedIdentity = (correctionId: number): string => `+${correctionId}`;

/**
 * Applies corrections to an edition: additions first, then changes and ticks by date, so that the
 * latest word counts. An added station gives way to an official one of its identity. Of several
 * stations of one identity (transmitters in step) the one nearest to where the corrected one stood
 * is meant.
 */
export function correctedList(
  corrections: readonly AppliedCorrection[],
  listed: readonly Listed[],
): CorrectedList {
  const fold = new Fold(listed);
  const byDate = [...corrections].sort((a, b) => a.date.localeCompare(b.date) || a.id - b.id);
  for (const each of byDate) if (each.kind === 'added') fold.add(each);
  for (const each of byDate) if (each.kind !== 'added') fold.apply(each);
  return fold.result(corrections);
}

interface Open {
  record: StationRecord;
  offAir: boolean;
  corrections: AppliedCorrection[];
}

class Fold {
  readonly #listed: ReadonlyMap<string, readonly StationRecord[]>;
  readonly #stations = new Map<number, Open>();
  readonly #stationOf = new Map<number, number>();

  constructor(listed: readonly Listed[]) {
    const byIdentity = new Map<string, StationRecord[]>();
    for (const { identity, record } of listed) {
      const known = byIdentity.get(identity);
      if (known) known.push(record);
      else byIdentity.set(identity, [record]);
    }
    this.#listed = byIdentity;
  }

  add(correction: AppliedCorrection): void {
    const official = this.#officialOf(correction);
    if (official) {
      this.#stationOf.set(correction.id, official.id);
      return;
    }
    const id = addedStationId(correction.id);
    const record = { ...correction.station, id, patternDb: null };
    this.#stationOf.set(correction.id, id);
    this.#stations.set(id, { record, offAir: false, corrections: [correction] });
  }

  apply(correction: AppliedCorrection): void {
    const station = this.#stationMeant(correction);
    if (!station) return;
    this.#stationOf.set(correction.id, station.record.id);
    station.corrections.push(correction);
    if (correction.kind !== 'changed') station.offAir = correction.kind === 'off-air';
    const given = Object.entries(correction.fields ?? {}).filter(
      ([, value]) => value !== undefined,
    );
    Object.assign(station.record, Object.fromEntries(given));
  }

  #stationMeant(correction: AppliedCorrection): Open | undefined {
    const { identity } = correction;
    const addedBy = identity.startsWith('+') ? Number(identity.slice(1)) : null;
    const id = addedBy === null ? undefined : this.#stationOf.get(addedBy);
    if (id !== undefined && isAdded(id)) return this.#stations.get(id);
    const official = id === undefined ? this.#officialOf(correction) : this.#officialById(id);
    return official && this.#opened(official);
  }

  #opened(official: StationRecord): Open {
    const known = this.#stations.get(official.id);
    if (known) return known;
    const fresh: Open = { record: { ...official }, offAir: false, corrections: [] };
    this.#stations.set(official.id, fresh);
    return fresh;
  }

  #officialById(id: number): StationRecord | undefined {
    return [...this.#listed.values()].flat().find((record) => record.id === id);
  }

  #officialOf({ identity, station }: AppliedCorrection): StationRecord | undefined {
    let nearest: StationRecord | undefined;
    for (const record of this.#listed.get(identity) ?? []) {
      if (!nearest || separation(record, station) < separation(nearest, station)) nearest = record;
    }
    return nearest;
  }

  result(corrections: readonly AppliedCorrection[]): CorrectedList {
    const computedWith = [...this.#stations.values()]
      .filter(({ offAir, corrections: own }) => offAir || own.some(isAboutStation))
      .map(({ record, offAir }) => [offAir, record]);
    return {
      stations: this.#stations,
      stationOf: this.#stationOf,
      version: computedWith.length === 0 ? '' : digest(computedWith),
      state:
        this.#stations.size === 0
          ? ''
          : digest(corrections.map(({ id, updatedAt }) => [id, updatedAt])),
    };
  }
}

const isAboutStation = ({ kind }: AppliedCorrection): boolean =>
  kind === 'added' || kind === 'changed';

const digest = (value: unknown): string =>
  hash('sha256', JSON.stringify(value), 'base64url').slice(0, 22);

interface MaybePlaced {
  readonly latitude: number | null;
  readonly longitude: number | null;
}

/** How far apart, for comparing only: squared degrees, a degree of longitude narrowed by latitude. */
function separation(one: MaybePlaced, other: MaybePlaced): number {
  if (one.latitude === null || one.longitude === null) return Infinity;
  if (other.latitude === null || other.longitude === null) return Infinity;
  const around = Math.abs(one.longitude - other.longitude);
  const east = Math.min(around, 360 - around) * Math.cos((one.latitude * Math.PI) / 180);
  return (one.latitude - other.latitude) ** 2 + east ** 2;
}
