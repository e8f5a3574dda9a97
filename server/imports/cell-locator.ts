import { locatorCentre } from '../../shared/radio/propagation/locator.ts';

const PATTERN = /^[A-R]{2}\d{2}(?:[A-X]{2}(?:\d{2})?)?$/i;

/** Centre of a locator of 4, 6 or 8 characters; null for other text. Two say too little of a place. */
export function readLocator(cell: string): { latitude: number; longitude: number } | null {
  const text = cell.trim();
  if (!PATTERN.test(text)) return null;
  const { latitude, longitude } = locatorCentre(text);
  return { latitude: Number(latitude.toFixed(7)), longitude: Number(longitude.toFixed(7)) };
}
