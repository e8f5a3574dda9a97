import { inPicture, type MapView, type PlanePoint, pixelsAKm } from './map-plane';
import { type MapStation, markRadius, type SizeScale } from './map-station';

/** Stations in view up to which each has a mark of its own. */
export const MOST_SINGLE = 2000;
/** Side of the square whose stations share a mark, CSS pixels. */
const CELL = 18;

/** A station with its place on the plane. */
export interface PlacedStation {
  readonly station: MapStation;
  readonly point: PlanePoint;
}

/** A mark of the map: a station, and those around it that share the mark. */
export interface MapMark {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly radius: number;
  readonly station: MapStation;
  /** Stations beneath the mark beside its own. */
  readonly others: number;
}

interface Size {
  readonly width: number;
  readonly height: number;
}

/**
 * Marks of the stations in view. Where they are too many, those of one square share the mark of the
 * strongest; the squares stay where they are while the map is moved.
 *
 * @param stations The strongest first.
 */
export function marksInView(
  stations: readonly PlacedStation[],
  view: MapView,
  size: Size,
  sizes: SizeScale,
): MapMark[] {
  const shown = stations.filter(({ point }) => isInView(inPicture(point, view, size), size));
  const mark = ({ station, point }: PlacedStation, others: number): MapMark => ({
    id: station.id,
    ...inPicture(point, view, size),
    radius: markRadius(station.level, sizes),
    station,
    others,
  });
  if (shown.length <= MOST_SINGLE) return shown.map((each) => mark(each, 0));
  return groups(shown, pixelsAKm(view, size)).map(({ strongest, others }) =>
    mark(strongest, others),
  );
}

const isInView = ({ x, y }: PlanePoint, { width, height }: Size): boolean =>
  x > -CELL && y > -CELL && x < width + CELL && y < height + CELL;

interface Group {
  readonly strongest: PlacedStation;
  others: number;
}

function groups(stations: readonly PlacedStation[], scale: number): Group[] {
  const byCell = new Map<number, Group>();
  for (const each of stations) {
    const column = Math.floor((each.point.x * scale) / CELL);
    const row = Math.floor((each.point.y * scale) / CELL);
    // Wider than any map that can be zoomed out of: rows of squares do not run into each other.
    const cell = row * 1e8 + column;
    const group = byCell.get(cell);
    if (group) group.others += 1;
    else byCell.set(cell, { strongest: each, others: 0 });
  }
  return [...byCell.values()];
}

const short = (value: number): number => Math.round(value * 10) / 10;

const circle = (x: number, y: number, radius: number): string => {
  const r = short(radius);
  return `M${short(x - radius)},${short(y)}a${r},${r} 0 1 0 ${2 * r},0a${r},${r} 0 1 0 ${-2 * r},0Z`;
};

const diamond = (x: number, y: number, radius: number): string => {
  const r = short(1.3 * radius + 1);
  return `M${short(x)},${short(y - r)}l${r},${r}l${-r},${r}l${-r},${-r}Z`;
};

/** One path for all marks of a look, and one around those that stand for several stations. */
export interface MarkPaths {
  readonly plain: string;
  readonly offRaster: string;
  readonly offAir: string;
  readonly several: string;
}

export function markPaths(marks: readonly MapMark[]): MarkPaths {
  const parts = { plain: '', offRaster: '', offAir: '', several: '' };
  for (const { x, y, radius, station, others } of marks) {
    if (station.look === 'off-raster') parts.offRaster += diamond(x, y, radius);
    else if (station.look === 'off-air') parts.offAir += circle(x, y, radius);
    else parts.plain += circle(x, y, radius);
    if (others > 0) parts.several += circle(x, y, radius + 2.5);
  }
  return parts;
}
