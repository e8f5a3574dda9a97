import { extent, type ScaleLogarithmic, scaleLog } from 'd3';

import type { ReceiverFields } from '../receiver-form/controls';

/** Where the ranges of one band lie. */
export interface SketchRow {
  readonly name: string;
  readonly band: readonly [number, number];
  readonly image: readonly [number, number];
}

/** Bands that are complete, each with the range its images come from. */
export function sketchRows({ ifHz, bands }: ReceiverFields): SketchRow[] {
  return bands.flatMap(({ name, lowHz, highHz, oscillator }) => {
    if (!isDrawable(ifHz) || !isDrawable(lowHz) || highHz === null || highHz <= lowHz) return [];
    const away = oscillator === 'above' ? 2 * ifHz : -2 * ifHz;
    const image = [Math.abs(lowHz + away), Math.abs(highHz + away)].sort((a, b) => a - b);
    return [{ name, band: [lowHz, highHz], image: [image[0] ?? 0, image[1] ?? 0] }];
  });
}

/** Whether a frequency, as typed so far, has a place on a logarithmic scale. */
const isDrawable = (hz: number | null): hz is number => hz !== null && hz > 0;

/** A logarithmic scale that has room for everything the sketch shows. */
export function sketchScale(rows: readonly SketchRow[], ifHz: number | null, width: number) {
  const all = rows.flatMap(({ band, image }) => [...band, ...image]).concat(ifHz ?? []);
  const [low = 100_000, high = 30_000_000] = extent(all.filter((hz) => hz > 0));
  return scaleLog([low / 1.15, high * 1.15], [0, width]);
}

/** Round frequencies at a distance at which their numerals can be read. */
export function sketchMarks(scale: ScaleLogarithmic<number, number>, gap: number) {
  const round = scale.ticks(50).filter((hz) => /^[125]0*$/u.test(String(hz)));
  return round.reduce<{ hz: number; at: number }[]>((kept, hz) => {
    const at = scale(hz);
    const last = kept.at(-1);
    return last === undefined || at - last.at >= gap ? [...kept, { hz, at }] : kept;
  }, []);
}
