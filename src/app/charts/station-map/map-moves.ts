import { fittedView, type MapView, type PlanePoint } from './map-plane';

interface Size {
  readonly width: number;
  readonly height: number;
}

const ZOOM_STEP = 1.6;
/** Share of the picture by which it is moved. */
const MOVE_STEP = 0.25;

/** Where keys move the view. */
export const moves: Readonly<Record<string, PlanePoint>> = {
  ArrowLeft: { x: -1, y: 0 },
  ArrowRight: { x: 1, y: 0 },
  ArrowUp: { x: 0, y: -1 },
  ArrowDown: { x: 0, y: 1 },
};

export function moved(view: MapView, { x, y }: PlanePoint, size: Size): MapView {
  const step = view.acrossKm * MOVE_STEP;
  const upright = (step * size.height) / size.width;
  return fittedView({ ...view, x: view.x + x * step, y: view.y + y * upright }, size);
}

/** Zooms by some steps; below 0 outwards. */
export const closer = (view: MapView, steps: number, size: Size): MapView =>
  fittedView({ ...view, acrossKm: view.acrossKm / ZOOM_STEP ** steps }, size);
