import { textWidth } from './place-labels';

/** Position of a frequency in CSS pixels, rising with it. */
export type Position = (hz: number) => number;

/** A mark of a scale. */
export interface ScaleMark {
  readonly hz: number;
  readonly at: number;
}

/** A decade is divided into halves or into fifths, then into tenths. */
type Parts = 2 | 5;

/** The next finer step; each divides the one before. */
function finer(step: number, parts: Parts): number {
  return String(step).startsWith('1') ? step / parts : (step * parts) / 10;
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
  const [halves = [], fifths = []] = ([2, 5] as const).map((parts) => {
    let marks: number[] = [];
    for (let step = coarsest(high - low); step >= finest; step = finer(step, parts)) {
      marks = divided(marks, step, position, low, high, gap);
    }
    return marks;
  });
  // Fifths read less easily: they are taken where halves leave the scale bare.
  const marks = fifths.length > 1.5 * halves.length ? fifths : halves;
  return marks.map((hz) => ({ hz, at: position(hz) }));
}

/** A numeral on a scale. */
export interface Numeral extends ScaleMark {
  readonly text: string;
}

const LEAST_GAP = 36;
const AIR = 10;

/** Numerals as close together as their texts allow. */
export function numerals(
  position: Position,
  low: number,
  high: number,
  write: (hz: number) => string,
  size = 12,
): Numeral[] {
  let gap = LEAST_GAP;
  for (;;) {
    const found = scaleMarks(position, low, high, gap).map((mark) => ({
      ...mark,
      text: write(mark.hz),
    }));
    const widest = Math.max(0, ...found.map(({ text }) => textWidth(text, size))) + AIR;
    if (widest <= gap || found.length < 2) return found;
    gap = widest;
  }
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
