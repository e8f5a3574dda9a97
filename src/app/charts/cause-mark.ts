import {
  symbol,
  symbolCircle,
  symbolCross,
  symbolDiamond,
  symbolSquare,
  symbolStar,
  symbolTriangle,
  type SymbolType,
  symbolWye,
} from 'd3';

import type { Assessment } from '../../../shared/contracts/assessment';
import { hueColour, type HueName } from './palette';

/** How a station comes to be heard where it is not. */
export type Cause = Assessment['bands'][number]['responses'][number]['cause'];

/** How a cause looks: told by shape and dash as well as by hue. */
export interface CauseMark {
  readonly cause: Cause;
  /** The cause in words, lower case. */
  readonly label: string;
  /** CSS colour that follows the theme. */
  readonly colour: string;
  /** `stroke-dasharray` of its stems. */
  readonly dash: string;
  /** Outline around (0, 0). */
  readonly path: string;
  readonly shape: SymbolType;
  readonly isHollow: boolean;
}

/** Of a mark, square CSS pixels. */
export const MARK_AREA = 64;

function mark(
  cause: Cause,
  label: string,
  hue: HueName,
  dash: string,
  shape: SymbolType,
  isHollow = false,
): CauseMark {
  const path = symbol(shape, MARK_AREA)() ?? '';
  return { cause, label, colour: hueColour(hue), dash, path, shape, isHollow };
}

/** The marks in the order they are listed to people. */
export const causeMarks: readonly CauseMark[] = [
  mark('image', $localize`image`, 'violet', 'none', symbolTriangle),
  mark('breakthrough', $localize`IF breakthrough`, 'brick', '7 2', symbolDiamond),
  mark('half-if', $localize`half-IF response`, 'green', '2 2', symbolSquare),
  mark('oscillator-harmonic', $localize`oscillator harmonic`, 'purple', '5 2 1 2', symbolStar),
  mark('product', $localize`mixer product`, 'ochre', '1 3', symbolCross),
  mark('second-image', $localize`second image`, 'violet', '9 3 2 3', symbolCircle, true),
  mark('intermodulation', $localize`intermodulation`, 'ochre', '3 4', symbolWye, true),
];

const byCause = new Map(causeMarks.map((each) => [each.cause, each]));

/** The mark of a cause. */
export function causeMark(cause: Cause): CauseMark {
  const found = byCause.get(cause);
  if (!found) throw new RangeError(`no mark for the cause ${cause}`);
  return found;
}
