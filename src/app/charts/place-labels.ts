/** A label that asks for room on a line. */
export interface LabelRequest {
  readonly id: string;
  readonly text: string;
  /** Where its middle would best be, CSS pixels. */
  readonly at: number;
  /** The higher, the sooner it gets its room. */
  readonly weight: number;
}

/** A label with its room: middle, and line counted from 0. */
export interface PlacedLabel extends LabelRequest {
  readonly x: number;
  readonly line: number;
}

const GAP = 8;
const MEAN_ADVANCE = 0.56;

/** Width of a text in Fira Sans, estimated from above for figures and lower case. */
export const textWidth = (text: string, size = 12): number => text.length * size * MEAN_ADVANCE;

/**
 * Places labels on a few lines so that none overlaps another: the weightiest first, on the first
 * line that has room; what finds none is left out (its mark still has a readout).
 *
 * @param requests Labels with where they would best be.
 * @param room Left and right limits, CSS pixels.
 * @param lines Number of lines.
 * @param size Height of the type, CSS pixels.
 * @returns The labels that found room, in the order of the requests.
 */
export function placeLabels(
  requests: readonly LabelRequest[],
  room: readonly [number, number],
  lines: number,
  size = 12,
): PlacedLabel[] {
  const taken: { from: number; to: number }[][] = Array.from({ length: lines }, () => []);
  const placed = new Map<string, PlacedLabel>();
  for (const request of [...requests].sort((a, b) => b.weight - a.weight)) {
    const half = textWidth(request.text, size) / 2;
    if (room[1] - room[0] < 2 * half) continue;
    const x = Math.min(Math.max(request.at, room[0] + half), room[1] - half);
    const [from, to] = [x - half - GAP / 2, x + half + GAP / 2];
    const line = taken.findIndex((each) => each.every((one) => to <= one.from || from >= one.to));
    if (line < 0) continue;
    taken[line]?.push({ from, to });
    placed.set(request.id, { ...request, x, line });
  }
  return requests.flatMap(({ id }) => placed.get(id) ?? []);
}
