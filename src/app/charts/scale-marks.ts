/** Position of a frequency in CSS pixels, rising with it. */
export type Position = (hz: number) => number;

/** A mark of a scale. */
export interface ScaleMark {
  readonly hz: number;
  readonly at: number;
}

/** Every decade, its half and its tenth, in turn: each step divides the one before. */
function finer(step: number): number {
  return Number(String(step)[0]) === 1 ? step / 2 : step / 5;
}

function coarsest(span: number): number {
  return 10 ** Math.ceil(Math.log10(span));
}

function multiples(step: number, low: number, high: number): number[] {
  const first = Math.ceil(low / step);
  const count = Math.max(0, Math.floor(high / step) - first + 1);
  return Array.from({ length: count }, (_, at) => (first + at) * step);
}

/**
 * Marks at round frequencies, as on a dial: as fine as room allows, in each stretch of the scale
 * by itself, so that a logarithmic scale is as evenly filled as a linear one.
 *
 * A stretch between two marks is divided when every new mark keeps its distance from its
 * neighbours; ends of the scale that carry no mark of their own do not count as neighbours.
 *
 * @param position Where a frequency lies.
 * @param low Low end, hertz.
 * @param high High end, hertz.
 * @param gap Least distance between two marks, CSS pixels.
 * @param finest Smallest step between two marks, hertz.
 */
export function scaleMarks(
  position: Position,
  low: number,
  high: number,
  gap: number,
  finest = 100,
): ScaleMark[] {
  if (!(high > low)) return [];
  let marks: number[] = [];
  for (let step = coarsest(high - low); step >= finest; step = finer(step)) {
    marks = divided(marks, step, position, low, high, gap);
  }
  return marks.map((hz) => ({ hz, at: position(hz) }));
}

/** The marks and what fits between each two of them at the next step. */
function divided(
  marks: readonly number[],
  step: number,
  position: Position,
  low: number,
  high: number,
  gap: number,
): number[] {
  const bounds = [undefined, ...marks, undefined];
  return bounds.slice(1).flatMap((end, at) => {
    const start = bounds[at];
    const width = position(end ?? high) - position(start ?? low);
    const isTooFine = ((end ?? high) - (start ?? low)) / step > width / gap + 2;
    const inside = isTooFine
      ? []
      : multiples(step, start ?? low, end ?? high).filter((hz) => hz !== start && hz !== end);
    const chain = [start, ...inside, end].filter((hz) => hz !== undefined).map(position);
    const fits = chain.every((x, index) => index === 0 || x - (chain[index - 1] ?? 0) >= gap);
    const kept = fits ? inside : [];
    return end === undefined ? kept : [...kept, end];
  });
}
