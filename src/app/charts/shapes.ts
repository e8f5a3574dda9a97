import { type Path, path, type SymbolType } from 'd3';

interface Place {
  readonly x: number;
  readonly y: number;
}

const DIGITS = 100;
const short = (value: number): number => Math.round(value * DIGITS) / DIGITS;

/** The strokes from which d3 draws its shapes, moved to a place. */
const movedTo = (
  out: Path,
  { x: dx, y: dy }: Place,
): Pick<Path, 'moveTo' | 'lineTo' | 'closePath' | 'arc' | 'rect'> => ({
  moveTo: (x, y) => {
    out.moveTo(short(x + dx), short(y + dy));
  },
  lineTo: (x, y) => {
    out.lineTo(short(x + dx), short(y + dy));
  },
  closePath: () => {
    out.closePath();
  },
  arc: (x, y, radius, from, to) => {
    out.moveTo(short(x + dx + radius), short(y + dy));
    out.arc(short(x + dx), short(y + dy), radius, from, to);
  },
  rect: (x, y, width, height) => {
    out.rect(short(x + dx), short(y + dy), width, height);
  },
});

/** One path with a shape at each place: a thousand marks cost one element. */
export function shapesAt(shape: SymbolType, area: number, places: readonly Place[]): string {
  const out = path();
  for (const place of places)
    shape.draw(movedTo(out, place) as Parameters<SymbolType['draw']>[0], area);
  return out.toString();
}
