import { move } from 'piscina';

import { designTracking as design } from '../../shared/radio/tracking/tracking.ts';
import { BEGUN, type Order, type Refused, STOP } from './engine-order.ts';
import * as tasks from './engine-tasks.ts';
import type { Tasks } from './engine-tasks.ts';
import { tooCostly, workloadOf } from './workload.ts';

const encoder = new TextEncoder();

/**
 * Runs a computation and answers it as JSON, so that the event loop need not write it out. The bytes
 * are moved to the other thread: copying the largest answers there would hold the loop.
 */
function answered<K extends keyof Tasks>(
  name: K,
  compute: (task: Tasks[K]['takes'], checkpoint: () => void) => Tasks[K]['answers'],
) {
  return ({ task, mostSettings, flags }: Order) => {
    Atomics.store(flags, BEGUN, 1);
    const checkpoint = (): void => {
      if (Atomics.load(flags, STOP) === 1) throw new Error('Nobody waits for the answer.');
    };
    checkpoint();
    const issues = tooCostly(workloadOf(name, task), mostSettings);
    if (issues.length > 0) return { issues } satisfies Refused;
    const answer = compute(task as Tasks[K]['takes'], checkpoint);
    return move(encoder.encode(JSON.stringify(answer)));
  };
}

export const assess = answered('assess', tasks.assess);
export const judgeBriefly = answered('judgeBriefly', tasks.judgeBriefly);
export const pickStations = answered('pickStations', tasks.pickStations);
export const judgeCandidates = answered('judgeCandidates', tasks.judgeCandidates);
export const findCures = answered('findCures', tasks.findCures);
export const breakthroughHours = answered('breakthroughHours', tasks.breakthroughHours);
export const fieldStrengths = answered('fieldStrengths', tasks.fieldStrengths);
export const designTracking = answered('designTracking', design);
export const explainWhistle = answered('explainWhistle', tasks.explainWhistle);
