import type { Period } from '../../shared/radio/site.ts';
import { BoundedCache } from './bounded-cache.ts';
import type { ListAtSite } from './engine-tasks.ts';
import { placeKey } from './list-key.ts';

/** A list's stations by some quantity, ascending, those without it last. In shared memory. */
export interface StationOrder {
  readonly indices: Uint32Array;
  /** Once a thread has filled it: 1, and how many have the quantity. */
  readonly ready: Int32Array;
}

const KEPT_STATIONS = 5_000_000;

/** Keeps the orders of long lists, so that any thread can pick a page from them. */
export class StationOrders {
  private readonly kept = new BoundedCache<StationOrder>(KEPT_STATIONS);

  /** Room for the order by one quantity. */
  roomFor({ site, content, columns }: ListAtSite, period: Period, sort: string): StationOrder {
    const key = [placeKey(content ?? '', site), period, sort].join();
    return this.kept.remember(key, columns.count, () => ({
      indices: new Uint32Array(new SharedArrayBuffer(columns.count * 4)),
      ready: new Int32Array(new SharedArrayBuffer(8)),
    }));
  }
}
