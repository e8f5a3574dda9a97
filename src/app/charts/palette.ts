/** A colour of a mark on each ground. */
export interface Hue {
  /** On paper, the light ground. */
  readonly paper: string;
  /** On walnut, the dark ground. */
  readonly walnut: string;
}

export type HueName = 'violet' | 'brick' | 'green' | 'purple' | 'ochre';

/**
 * The five hues of the charts. Each stands out from its ground by 3:1 at least and is told from
 * every other with each of the three common colour deficiencies; the spec beside this computes it.
 */
export const hues: Readonly<Record<HueName, Hue>> = {
  violet: { paper: '#7877f3', walnut: '#6c68d3' },
  brick: { paper: '#850406', walnut: '#c94252' },
  green: { paper: '#089c72', walnut: '#18d79c' },
  purple: { paper: '#96049d', walnut: '#e296fe' },
  ochre: { paper: '#bb7b15', walnut: '#b5920a' },
};

/** The hue as a CSS colour that follows the theme; the paper's own colour of marks when printed. */
export const hueColour = (name: HueName): string =>
  `var(--fallow-mark, light-dark(${hues[name].paper}, ${hues[name].walnut}))`;
