import type { ImportCheck, ImportRemark } from '../../shared/contracts/list-import.ts';
import { nearestChannel } from '../../shared/radio/channels/raster.ts';
import type { RasterRange } from '../../shared/radio/station.ts';
import { REMARKS, type RemarkKind } from './row-remarks.ts';

/** A stored row as far as comparing needs it. */
export interface KnownRow {
  readonly identity: string;
  readonly fingerprint: string;
}

/** What a row says about where and how strong the station is. */
interface Facts {
  readonly frequencyHz: number;
  readonly latitude: number | null;
  readonly powerDayW: number | null;
  readonly powerNightW: number | null;
}

interface Count {
  listed: number;
  offered: number;
  same: number;
}

const LINES_SHOWN = 5;

/**
 * Compares a list, row by row, with the edition before it. Several rows may share an identity
 * (transmitters in step on one channel), so identities are counted, not looked up; the order of
 * rows never matters.
 */
export class RowTally {
  /** Counts by identity; only of what the edition lists. */
  readonly #identities = new Map<string, Count>();
  /** Fingerprints met: false in the edition only, true in this list. */
  readonly #fingerprints = new Map<string, boolean>();
  readonly #remarks = new Map<RemarkKind, { count: number; lines: number[] }>();
  readonly #raster: readonly RasterRange[];
  #listed = 0;
  #unlisted = 0;
  #rejected = 0;
  #merged = 0;
  #offRaster = 0;
  #withoutPlace = 0;
  #withoutPower = 0;
  protected duplicates = 0;

  constructor(raster: readonly RasterRange[] = []) {
    this.#raster = raster;
  }

  know(rows: readonly KnownRow[]): void {
    for (const { identity, fingerprint } of rows) {
      this.#listed += 1;
      this.#fingerprints.set(fingerprint, false);
      const count = this.#identities.get(identity);
      if (count) count.listed += 1;
      else this.#identities.set(identity, { listed: 1, offered: 0, same: 0 });
    }
  }

  /** Counts a good row; false when it need not be stored: the list has said exactly the same before. */
  add({ identity, fingerprint }: KnownRow): boolean {
    const met = this.#fingerprints.get(fingerprint);
    if (met === true) {
      this.duplicates += 1;
      return false;
    }
    this.#fingerprints.set(fingerprint, true);
    const count = this.#identities.get(identity);
    if (!count) {
      this.#unlisted += 1;
      return true;
    }
    count.offered += 1;
    if (met === false) count.same += 1;
    return true;
  }

  /** Counts a row that says what another has said. */
  repeat(): void {
    this.duplicates += 1;
  }

  reject(): void {
    this.#rejected += 1;
  }

  /** Counts a row whose station is told by another row. */
  merge(): void {
    this.#merged += 1;
  }

  /** Notes what a stored row lacks. */
  note({ frequencyHz, latitude, powerDayW, powerNightW }: Facts): void {
    if (latitude === null) this.#withoutPlace += 1;
    if (powerDayW === null && powerNightW === null) this.#withoutPower += 1;
    if (nearestChannel(this.#raster, frequencyHz) !== frequencyHz) this.#offRaster += 1;
  }

  /** Notes what was done with a row that does not go without saying. */
  remark(kind: RemarkKind, line: number): void {
    const remark = this.#remarks.get(kind);
    if (!remark) this.#remarks.set(kind, { count: 1, lines: [line] });
    else {
      remark.count += 1;
      if (remark.lines.length < LINES_SHOWN) remark.lines.push(line);
    }
  }

  get remarks(): ImportRemark[] {
    return [...this.#remarks].map(([kind, found]) => ({ message: REMARKS[kind], ...found }));
  }

  get rows(): ImportCheck['rows'] {
    const { same, changed, gone, kept, ...compared } = this.compared();
    const rejected = this.#rejected;
    const duplicate = this.duplicates;
    const merged = this.#merged;
    return {
      total: compared.new + changed + same + rejected + duplicate + merged,
      new: compared.new,
      changed,
      same,
      rejected,
      duplicate,
      merged,
      gone,
      kept,
      offRaster: this.#offRaster,
      withoutPlace: this.#withoutPlace,
      withoutPower: this.#withoutPower,
    };
  }

  /** The list beside the edition before it. */
  protected compared(): Pick<ImportCheck['rows'], 'new' | 'changed' | 'same' | 'gone' | 'kept'> {
    const rows = { new: this.#unlisted, changed: 0, same: 0 };
    for (const { listed, offered, same } of this.#identities.values()) {
      const changed = Math.min(offered - same, listed - same);
      rows.same += same;
      rows.changed += changed;
      rows.new += offered - same - changed;
    }
    return { ...rows, gone: this.#listed - rows.same - rows.changed, kept: 0 };
  }
}
