/** A point, CSS pixels. */
export interface Spot {
  readonly x: number;
  readonly y: number;
}

/** A label that asks for room. */
export interface LabelRequest {
  readonly id: string;
  readonly text: string;
  /** Where its middle may stand, the best first. */
  readonly spots: readonly Spot[];
  /** The higher, the sooner it gets its room. */
  readonly weight: number;
}

/** A label with its room. */
export interface PlacedLabel extends Spot {
  readonly id: string;
  readonly text: string;
}

/** A rectangle that is taken. */
export interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

const GAP = 6;
const MEAN_ADVANCE = 0.56;

/** Width of a text in Fira Sans, estimated from above for figures and lower case. */
export const textWidth = (text: string, size = 12): number => text.length * size * MEAN_ADVANCE;

/** The rectangle a label covers, with a little air to its sides. */
export function labelBox({ x, y, text }: Spot & { readonly text: string }, size = 12): Box {
  const half = textWidth(text, size) / 2 + GAP / 2;
  return { left: x - half, right: x + half, top: y - size / 2 - 1, bottom: y + size / 2 + 1 };
}

const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/**
 * Places labels so that none overlaps another: the weightiest first, each at the first of its spots
 * that is free. What finds no room is left out; its mark still has a readout.
 *
 * @param requests Labels with where they may stand.
 * @param room Left and right limits; a label is moved sideways into them.
 * @param taken Rectangles no label may cover.
 * @param size Height of the type, CSS pixels.
 * @returns The labels that found room, in the order of the requests.
 */
export function placeLabels(
  requests: readonly LabelRequest[],
  room: readonly [number, number],
  taken: readonly Box[] = [],
  size = 12,
): PlacedLabel[] {
  const boxes = [...taken];
  const placed = new Map<string, PlacedLabel>();
  for (const { id, text, spots } of [...requests].sort((a, b) => b.weight - a.weight)) {
    const half = textWidth(text, size) / 2;
    if (room[1] - room[0] < 2 * half) continue;
    for (const spot of spots) {
      const x = Math.min(Math.max(spot.x, room[0] + half), room[1] - half);
      const label = { id, text, x, y: spot.y };
      const box = labelBox(label, size);
      if (boxes.some((each) => overlap(each, box))) continue;
      boxes.push(box);
      placed.set(id, label);
      break;
    }
  }
  return requests.flatMap(({ id }) => placed.get(id) ?? []);
}
