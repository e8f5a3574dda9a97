import type { ImportCheck } from '../../shared/contracts/list-import.ts';
import { type KnownRow, RowTally } from './row-tally.ts';

/** A stored station as far as adding to its edition needs it. */
export interface PlacedRow extends KnownRow {
  readonly id: number;
  readonly latitude: number | null;
  readonly longitude: number | null;
}

type Offered = KnownRow & Pick<PlacedRow, 'latitude' | 'longitude'>;
type Listed = PlacedRow & { isTaken: boolean };

/** Nearer than this, in degrees, two places are one station's. */
const SAME_PLACE = 0.02;

/**
 * Compares rows with the edition that they are added to. A row takes the place of the station that
 * has its name or call sign, frequency and place; any other row is added: two transmitters in step
 * share a name and a channel, and neither may push the other out.
 */
export class AddingTally extends RowTally {
  readonly #listed = new Map<string, Listed[]>();
  readonly #met = new Set<string>();
  readonly #replaced: number[] = [];
  #count = 0;
  #new = 0;
  #same = 0;

  override know(rows: readonly (KnownRow & Partial<PlacedRow>)[]): void {
    for (const { identity, fingerprint, id = 0, latitude = null, longitude = null } of rows) {
      this.#count += 1;
      const listed = { identity, fingerprint, id, latitude, longitude, isTaken: false };
      const alike = this.#listed.get(identity);
      if (alike) alike.push(listed);
      else this.#listed.set(identity, [listed]);
    }
  }

  override add(row: Offered): boolean {
    if (this.#met.has(row.fingerprint)) {
      this.duplicates += 1;
      return false;
    }
    this.#met.add(row.fingerprint);
    const free = (this.#listed.get(row.identity) ?? []).filter(({ isTaken }) => !isTaken);
    const equal = free.find(({ fingerprint }) => fingerprint === row.fingerprint);
    const before = equal ?? free.find((listed) => isSamePlace(listed, row));
    if (before) before.isTaken = true;
    if (equal) this.#same += 1;
    else if (before) this.#replaced.push(before.id);
    else this.#new += 1;
    return !equal;
  }

  /** Ids of the stations whose place new rows take. */
  get replaced(): readonly number[] {
    return this.#replaced;
  }

  protected override compared(): Pick<
    ImportCheck['rows'],
    'new' | 'changed' | 'same' | 'gone' | 'kept'
  > {
    const changed = this.#replaced.length;
    return { new: this.#new, changed, same: this.#same, gone: 0, kept: this.#count - changed };
  }
}

function isSamePlace(a: Pick<Offered, 'latitude' | 'longitude'>, b: Offered): boolean {
  if (a.latitude === null || a.longitude === null) return true;
  if (b.latitude === null || b.longitude === null) return true;
  return (
    Math.abs(a.latitude - b.latitude) < SAME_PLACE &&
    Math.abs(a.longitude - b.longitude) < SAME_PLACE
  );
}
