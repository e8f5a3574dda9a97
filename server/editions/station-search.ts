const HZ_PER_UNIT: Readonly<Record<string, number>> = { hz: 1, khz: 1e3, mhz: 1e6 };

/** Frequency meant by "612", "612 kHz", "0,612 MHz" or "612000 Hz"; null when the text is none. */
export function searchedFrequency(text: string): number | null {
  const match = /^(\d+(?:[.,]\d+)?)\s*(k?hz|mhz)?$/i.exec(text.trim());
  if (!match) return null;
  const value = Number(match[1]?.replace(',', '.'));
  const hertz = Math.round(value * (HZ_PER_UNIT[match[2]?.toLowerCase() ?? 'khz'] ?? 1e3));
  return hertz <= 4_294_967_295 ? hertz : null;
}
