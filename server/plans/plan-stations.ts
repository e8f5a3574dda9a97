import type { Assessment } from '../../shared/radio/assessment/assessment.ts';
import { planJudgement, type PlanJudgement } from '../../shared/contracts/plan.ts';

/** Names under which answers of the engine speak of stations. */
const SINGLE = new Set(['station', 'secondStation', 'wantedStation']);

/** Ids of all stations that an answer speaks of, ascending. */
export function stationsIn(answer: unknown): number[] {
  const found = new Set<number>();
  changeStations(answer, (id) => {
    found.add(id);
    return id;
  });
  return [...found].sort((a, b) => a - b);
}

/** The answer with every station called by its place in a list of ids. */
export function byPlaceIn<T>(ids: readonly number[], answer: T): T {
  const places = new Map(ids.map((id, place) => [id, place]));
  return changeStations(answer, (id) => places.get(id) ?? id) as T;
}

function changeStations(value: unknown, change: (id: number) => number): unknown {
  if (Array.isArray(value)) return value.map((each) => changeStations(each, change));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([key, part]: [string, unknown]) => [
      key,
      SINGLE.has(key) && typeof part === 'number' ? change(part) : changeStations(part, change),
    ]),
  );
}

/** What a plan keeps of an assessment: no totals, and stations left out counted by reason. */
export function judgementOf({ warnings, skipped, bands }: Assessment): PlanJudgement {
  const counts = new Map<string, number>();
  for (const { reason } of skipped) counts.set(reason, (counts.get(reason) ?? 0) + 1);
  const leftOut = [...counts].map(([reason, count]) => ({ reason, count }));
  return planJudgement.parse({ warnings, leftOut, bands });
}
