/** Low and high end of what a chart shows, in the chart's own unit. */
export type Window = readonly [number, number];

/** The scale over the whole range: a frequency to pixels and back. */
export interface WholeScale {
  (value: number): number;
  invert(pixel: number): number;
  domain(): number[];
  range(): number[];
}

/** How far a chart can be zoomed in. */
export const MOST_ZOOM = 64;

function ends(scale: WholeScale): { range: Window; domain: Window } {
  const [left = 0, right = 1] = scale.range();
  const [low = 0, high = 1] = scale.domain();
  return { range: [left, right], domain: [low, high] };
}

/** Fits a stretch of pixels into the whole range, moved before it is shortened. */
function fitted(scale: WholeScale, from: number, to: number): Window {
  const { range, domain } = ends(scale);
  const size = range[1] - range[0];
  const length = Math.min(Math.max(to - from, size / MOST_ZOOM), size);
  if (length >= size) return domain;
  const middle = (from + to) / 2;
  const start = Math.min(Math.max(middle - length / 2, range[0]), range[1] - length);
  return [scale.invert(start), scale.invert(start + length)];
}

/** The window that shows `1/factor` of the present one, around its middle or a value given. */
export function zoomed(scale: WholeScale, window: Window, factor: number, about?: number): Window {
  const [from, to] = [scale(window[0]), scale(window[1])];
  const fixed = about === undefined ? (from + to) / 2 : scale(about);
  return fitted(scale, fixed - (fixed - from) / factor, fixed + (to - fixed) / factor);
}

/** The window someone typed, brought into the whole range; ends may come in either order. */
export function windowBetween(scale: WholeScale, one: number, other: number): Window {
  const { domain } = ends(scale);
  const clamp = (value: number) => Math.min(Math.max(value, domain[0]), domain[1]);
  const [low, high] = [clamp(Math.min(one, other)), clamp(Math.max(one, other))];
  return fitted(scale, scale(low), scale(high));
}

/** The smallest move of the window that brings a value into view. */
export function showing(scale: WholeScale, window: Window, value: number): Window {
  if (value >= window[0] && value <= window[1]) return window;
  const half = (scale(window[1]) - scale(window[0])) / 2;
  return fitted(scale, scale(value) - half, scale(value) + half);
}
