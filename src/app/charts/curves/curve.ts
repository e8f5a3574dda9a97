import { symbol, symbolCircle, symbolCross, symbolDiamond, symbolSquare, symbolTriangle } from 'd3';

import { hueColour } from '../palette';

/** A point of a curve. */
export interface CurvePoint {
  /** Along the chart: hertz, or minutes of the day. */
  readonly at: number;
  /** Up the chart; null: a gap in the curve. */
  readonly level: number | null;
}

/** A named curve of a chart. Curves of one chart share their places along it as far as they can. */
export interface Curve {
  readonly id: string;
  /** Short: it stands beside the curve. */
  readonly name: string;
  /** From left to right. */
  readonly points: readonly CurvePoint[];
  /** Points that were measured: each is drawn, and no line joins them. */
  readonly isMeasured?: boolean;
}

/** How a curve is told from the others: by dash and mark as well as by hue. */
export interface CurveLook {
  readonly colour: string;
  readonly dash: string;
  readonly path: string;
}

const HUES = ['brick', 'green', 'violet', 'ochre', 'purple'] as const;
const DASHES = ['none', '8 3', '2 3', '10 3 2 3', '5 2'];
const SHAPES = [symbolCircle, symbolTriangle, symbolSquare, symbolDiamond, symbolCross];
const AREA = 44;

/** The look of the curve at this place among those of its chart; it repeats after five. */
export function curveLook(index: number): CurveLook {
  const at = index % HUES.length;
  return {
    colour: hueColour(HUES[at] ?? 'brick'),
    dash: DASHES[at] ?? 'none',
    path: symbol(SHAPES[at], AREA)() ?? '',
  };
}
