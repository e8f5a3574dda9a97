import { move } from 'piscina';

import { designTracking as design } from '../../shared/radio/tracking/tracking.ts';
import * as tasks from './engine-tasks.ts';

/** A computation, and where it says that it has begun. */
export interface Order {
  readonly task: unknown;
  readonly begun: Int32Array;
}

const encoder = new TextEncoder();

/**
 * Runs a computation and answers it as JSON, so that the event loop need not write it out. The bytes
 * are moved to the other thread: copying the largest answers there would hold the loop.
 */
function answered(compute: (task: never) => unknown) {
  return ({ task, begun }: Order) => {
    Atomics.store(begun, 0, 1);
    return move(encoder.encode(JSON.stringify(compute(task as never))));
  };
}

export const assess = answered(tasks.assess);
export const judgeCandidates = answered(tasks.judgeCandidates);
export const findCures = answered(tasks.findCures);
export const breakthroughHours = answered(tasks.breakthroughHours);
export const fieldStrengths = answered(tasks.fieldStrengths);
export const designTracking = answered(design);
export const explainWhistle = answered(tasks.explainWhistle);
