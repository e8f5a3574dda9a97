/** A point a reader can ask about. */
export interface PlotMark {
  /** The same in every chart and table that shows the thing. */
  readonly id: string;
  /** Inside the frame's inner area, CSS pixels. */
  readonly x: number;
  readonly y: number;
}

/** One line of a readout. */
export interface ReadoutLine {
  readonly label: string;
  readonly value: string;
}

/** What a chart says about one mark: exact values with their units. */
export interface Readout {
  readonly title: string;
  readonly lines: readonly ReadoutLine[];
}

/** The marks from left to right, the upper first where two stand on one line. */
export function inReadingOrder(marks: readonly PlotMark[]): PlotMark[] {
  return [...marks].sort((a, b) => a.x - b.x || a.y - b.y || a.id.localeCompare(b.id));
}

/** The mark nearest to a point, if one lies within reach. */
export function nearestMark(
  marks: readonly PlotMark[],
  x: number,
  y: number,
  reach: number,
): PlotMark | undefined {
  let best: PlotMark | undefined;
  let least = reach;
  for (const mark of marks) {
    const distance = Math.hypot(mark.x - x, mark.y - y);
    if (distance > least) continue;
    best = mark;
    least = distance;
  }
  return best;
}

/** The mark nearest to a point along the chart, however far up or down. */
export const nearestAlong = (
  marks: readonly PlotMark[],
  x: number,
  reach: number,
): PlotMark | undefined =>
  nearestMark(
    marks.map((mark) => ({ ...mark, y: 0 })),
    x,
    0,
    reach,
  );

const STEPS: Readonly<Record<string, (at: number, count: number) => number>> = {
  ArrowRight: (at) => at + 1,
  ArrowDown: (at) => at + 1,
  ArrowLeft: (at) => at - 1,
  ArrowUp: (at) => at - 1,
  Home: () => 0,
  End: (_, count) => count - 1,
  PageDown: (at) => at + 10,
  PageUp: (at) => at - 10,
};

/**
 * The mark a key leads to from the present one.
 * @param ordered Marks in reading order.
 * @param present Id of the present mark, if any.
 * @param key `KeyboardEvent.key`.
 * @returns The mark, or undefined when the key does not move or there is nothing to move to.
 */
export function markByKey(
  ordered: readonly PlotMark[],
  present: string | null,
  key: string,
): PlotMark | undefined {
  const step = STEPS[key];
  if (!step || ordered.length === 0) return undefined;
  const at = ordered.findIndex(({ id }) => id === present);
  const isFirstMove = at < 0 && key !== 'End';
  const next = isFirstMove ? 0 : step(at, ordered.length);
  return ordered[Math.min(Math.max(next, 0), ordered.length - 1)];
}

/** The readout as one sentence for a screen reader. */
export const spoken = ({ title, lines }: Readout): string =>
  `${title}. ${lines.map(({ label, value }) => `${label}: ${value}`).join('; ')}.`;
