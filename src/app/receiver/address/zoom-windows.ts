import type { Window } from '../../charts/zoom-window';

/** The stretch of each band that is shown, by the band's place in the set; others: the whole. */
export type ZoomWindows = ReadonlyMap<number, Window>;

const NARROWEST_HZ = 100;
const ONE = /^(\d{1,2}):(\d{1,12})-(\d{1,12})$/;

/** Reads `1:600000-700000,3:9500000-9900000`, bands counted from 1; nonsense counts as not said. */
export function readZoom(text: string | null): ZoomWindows {
  const found = (text ?? '').split(',').flatMap((part): [number, Window][] => {
    const [, band, low, high] = (ONE.exec(part) ?? []).map(Number);
    if (band === undefined || low === undefined || high === undefined) return [];
    return band < 1 || high - low < NARROWEST_HZ ? [] : [[band - 1, [low, high]]];
  });
  return new Map(found);
}

/** Writes what `readZoom` reads; null: every band is shown whole. */
export function zoomText(windows: ZoomWindows): string | null {
  const parts = [...windows]
    .sort(([one], [other]) => one - other)
    .map(([band, [low, high]]) => `${band + 1}:${Math.round(low)}-${Math.round(high)}`);
  return parts.join(',') || null;
}

/** What of a window lies in a band; null: nothing, or the whole of it. */
export function withinBand(
  window: Window | undefined,
  { lowHz, highHz }: { readonly lowHz: number; readonly highHz: number },
): Window | null {
  if (!window) return null;
  const [low, high] = [Math.max(window[0], lowHz), Math.min(window[1], highHz)];
  return high - low < NARROWEST_HZ || (low === lowHz && high === highHz) ? null : [low, high];
}
