/** Room around the drawing for axes and labels, CSS pixels. */
export interface Margin {
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
  readonly left: number;
}

/** Where a chart draws: the whole picture, and the area inside its margins. */
export interface Frame {
  readonly width: number;
  readonly height: number;
  readonly margin: Margin;
  readonly innerWidth: number;
  readonly innerHeight: number;
}

/** A picture too narrow to draw in still has an area of 40 by 40. */
export function frame(width: number, height: number, margin: Margin): Frame {
  return {
    width,
    height,
    margin,
    innerWidth: Math.max(40, width - margin.left - margin.right),
    innerHeight: Math.max(40, height - margin.top - margin.bottom),
  };
}

/** Below this width a chart lays itself out for a hand-held screen. */
export const NARROW = 560;
