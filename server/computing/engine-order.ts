import type { Issue } from '../http/errors.ts';

/** A computation, and what is said about it while it runs. */
export interface Order {
  readonly task: unknown;
  /** Dial settings that may be judged. */
  readonly mostSettings: number;
  /** At `BEGUN` the thread says that it has begun; at `STOP` the engine says that it is to stop. */
  readonly flags: Int32Array;
}
export const BEGUN = 0;
export const STOP = 1;

/** Why a request was not computed: what to leave out. */
export interface Refused {
  readonly issues: readonly Issue[];
}
