const PATTERN = /^[A-R]{2}\d{2}(?:[A-X]{2}(?:\d{2})?)?$/;

/** Step of each pair of characters in degrees of longitude; of latitude half as much. */
const STEPS = [20, 2, 1 / 12, 1 / 120] as const;

/** Centre of a Maidenhead locator's square; null when the text is no locator. */
export function readLocator(text: string): { latitude: number; longitude: number } | null {
  const locator = text.trim().toUpperCase();
  if (!PATTERN.test(locator)) return null;
  let longitude = -180;
  let latitude = -90;
  let step = 0;
  for (let at = 0; at < locator.length; at += 2) {
    step = STEPS[at / 2] ?? 0;
    longitude += digit(locator, at) * step;
    latitude += (digit(locator, at + 1) * step) / 2;
  }
  return {
    latitude: Number((latitude + step / 4).toFixed(7)),
    longitude: Number((longitude + step / 2).toFixed(7)),
  };
}

/** Letters count from A, digits from 0. */
function digit(locator: string, at: number): number {
  const code = locator.charCodeAt(at);
  return code >= 65 ? code - 65 : code - 48;
}
