import type { ImportCheck } from '../../shared/contracts/list-import.ts';

/** A stored row as far as comparing needs it. */
export interface KnownRow {
  readonly identity: string;
  readonly fingerprint: string;
}

interface Count {
  listed: number;
  offered: number;
  same: number;
}

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
  #unlisted = 0;
  #rejected = 0;
  #duplicate = 0;

  know(rows: readonly KnownRow[]): void {
    for (const { identity, fingerprint } of rows) {
      this.#fingerprints.set(fingerprint, false);
      const count = this.#identities.get(identity);
      if (count) count.listed += 1;
      else this.#identities.set(identity, { listed: 1, offered: 0, same: 0 });
    }
  }

  /** Counts a good row; false when the list has said exactly the same before. */
  add({ identity, fingerprint }: KnownRow): boolean {
    const met = this.#fingerprints.get(fingerprint);
    if (met === true) {
      this.#duplicate += 1;
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

  reject(): void {
    this.#rejected += 1;
  }

  get rows(): ImportCheck['rows'] {
    const rows = { new: this.#unlisted, changed: 0, same: 0 };
    for (const { listed, offered, same } of this.#identities.values()) {
      const changed = Math.min(offered - same, listed - same);
      rows.same += same;
      rows.changed += changed;
      rows.new += offered - same - changed;
    }
    const total = rows.new + rows.changed + rows.same + this.#rejected + this.#duplicate;
    return { total, ...rows, rejected: this.#rejected, duplicate: this.#duplicate };
  }
}
