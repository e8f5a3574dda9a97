import { type Place } from '../../../../shared/radio/propagation/path';
import { periodAt } from '../../../../shared/radio/propagation/sunlight';
import type { Window } from '../../charts/zoom-window';

const DAY_MINUTES = 24 * 60;
const STEP_MINUTES = 10;
const MINUTE_MS = 60_000;

/** From sunset to sunrise on a day, minutes since midnight UTC; a night over midnight comes in two. */
export function nightsOf(place: Place, date: string): Window[] {
  const begin = Date.parse(`${date}T00:00:00Z`);
  const nights: [number, number][] = [];
  for (let minute = 0; minute < DAY_MINUTES; minute += STEP_MINUTES) {
    if (periodAt(place, new Date(begin + minute * MINUTE_MS)) === 'day') continue;
    const last = nights.at(-1);
    if (last?.[1] === minute) last[1] = minute + STEP_MINUTES;
    else nights.push([minute, minute + STEP_MINUTES]);
  }
  return nights;
}
