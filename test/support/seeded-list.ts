/** Seeded lists of given fields for benchmarks: on the rasters of the bands, as real lists are. */
import type { FieldStrength } from '../../shared/radio/propagation/field-strength.ts';
import type { Receiver } from '../../shared/radio/receiver.ts';
import type { Site } from '../../shared/radio/site.ts';
import type { RasterRange, Station } from '../../shared/radio/station.ts';

/** Long and medium wave by 9 kHz, and the short-wave broadcast bands by 5 kHz. */
export const BENCH_RASTER: readonly RasterRange[] = [
  { lowHz: 153_000, highHz: 279_000, stepHz: 9_000 },
  { lowHz: 531_000, highHz: 1_602_000, stepHz: 9_000 },
  { lowHz: 3_900_000, highHz: 4_000_000, stepHz: 5_000 },
  { lowHz: 5_900_000, highHz: 6_200_000, stepHz: 5_000 },
  { lowHz: 7_200_000, highHz: 7_450_000, stepHz: 5_000 },
  { lowHz: 9_400_000, highHz: 9_900_000, stepHz: 5_000 },
  { lowHz: 11_600_000, highHz: 12_100_000, stepHz: 5_000 },
  { lowHz: 13_570_000, highHz: 13_870_000, stepHz: 5_000 },
  { lowHz: 15_100_000, highHz: 15_800_000, stepHz: 5_000 },
];

/** Share of the stations on each range, and off every raster (beacons, ships) from 200 kHz up. */
const SHARES = [0.02, 0.58, 0.02, 0.04, 0.04, 0.06, 0.06, 0.03, 0.05];

const LIMITS = [
  [150_000, 400_000],
  [520_000, 1_620_000],
  [1_600_000, 4_000_000],
  [3_900_000, 8_000_000],
  [7_900_000, 16_000_000],
  [15_900_000, 30_000_000],
] as const;

/** A communications receiver of six bands. */
export const BENCH_RECEIVER: Receiver = {
  name: 'bench',
  ifHz: 455_000,
  selectivity: { kind: 'widths', b6Hz: 6_000, b60Hz: 22_000 },
  audioCornerHz: 3_500,
  strayDb: { if: 75, image: 75 },
  ifFeedthroughDb: 3,
  signalToOscillatorDb: -25,
  ifRange: 0.06,
  fixedFilter: null,
  bfo: null,
  trap: null,
  aerial: null,
  secondConversion: null,
  bands: LIMITS.map(([lowHz, highHz], index) => ({
    name: `${index + 1}`,
    lowHz,
    highHz,
    oscillator: 'above',
    circuits: [
      { qLow: 60, qHigh: 60 },
      { qLow: 90, qHigh: 80 },
    ],
    oscillatorHarmonic: 1,
    service: 'broadcast',
    assumedWantedDb: null,
    tuningToleranceHz: null,
    dialStepHz: null,
    tracking: null,
  })),
};

export const BENCH_SITE: Site = {
  latitude: null,
  longitude: null,
  ground: null,
  noise: 'residential',
  indoors: false,
  noiseFloorDb: null,
  ituRegion: 1,
};

/** Numbers from 0 to 1, the same for the same seed (mulberry32). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** A list of any length; most stations are weak, a few strong. */
export function seededStations(count: number, seed = 1): Station[] {
  const random = seeded(seed);
  return Array.from({ length: count }, (_, id) => ({
    id,
    name: `station ${id}`,
    frequencyHz: drawFrequency(random),
    latitude: null,
    longitude: null,
    powerDayW: null,
    powerNightW: null,
    fieldDb: -30 + 120 * random() ** 3,
  }));
}

/** Fields as they were given. */
export function givenFields(stations: readonly Station[]): FieldStrength[] {
  return stations.map(({ id, fieldDb }) => ({
    station: id,
    distanceM: null,
    groundDb: fieldDb,
    skyDb: null,
    fieldDb,
    notes: [],
  }));
}

function drawFrequency(random: () => number): number {
  let place = random();
  for (const [index, { lowHz, highHz, stepHz }] of BENCH_RASTER.entries()) {
    const share = SHARES[index] ?? 0;
    if (place < share) {
      const channels = Math.floor((highHz - lowHz) / stepHz) + 1;
      return lowHz + stepHz * Math.floor((place / share) * channels);
    }
    place -= share;
  }
  return 200_000 + 1_000 * Math.floor(29_000 * random() ** 2);
}
