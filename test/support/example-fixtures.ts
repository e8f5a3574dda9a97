/** What examples in docstrings may use beside the engine itself. */
import type { Orderable } from '../../shared/radio/candidates/candidate-order.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { Site } from '../../shared/radio/site.ts';
import type { Station } from '../../shared/radio/station.ts';
import { paddedCircuit, plainCircuit } from '../../shared/radio/tracking/padded-circuit.ts';
import { trackingConstants } from '../../shared/radio/tracking/tracking-curve.ts';
import type { UnwantedCarrier } from '../../shared/radio/whistles/whistle-cause.ts';
import { givenStations, plainBand, plainReceiver, siteIn } from './plain-sets.ts';

/** A set with an IF of 560 kHz, two circuits of Q 80 and an IF of 6 and 22 kHz. */
export const band = plainBand({
  lowHz: 600_000,
  circuits: [
    { qLow: 80, qHigh: 80 },
    { qLow: 80, qHigh: 80 },
  ],
});
export const receiver = plainReceiver({ ifHz: 560_000, bands: [band] });

/** A residential street in Region 2, with strong stations on 550 and 560 kHz and one to hear. */
export const site: Site = siteIn(2, { latitude: 40, longitude: -100, ground: 'average' });
export const raster = defaultRaster(2);
const heard = givenStations([
  [550_000, 90],
  [560_000, 90],
  [1_000_000, 75],
]);
export const { stations, fields } = heard;

/** A station of 10 kW on 1 MHz, 50 km north of the site. */
export const station: Station = {
  id: 1,
  name: 'Vale',
  frequencyHz: 1_000_000,
  latitude: 40.45031,
  longitude: -100,
  powerDayW: 10_000,
  powerNightW: 10_000,
  fieldDb: null,
};

export const orders = { maxM: 3, maxN: 2 };
/** What the engine's computations take, for this set at this site by night. */
export const atSite = { receiver, site, raster, stations, fields };
export const judged = { site, raster, stations, fields: { night: fields } };

/** A station of 50 kW on the IF, 600 km north of the site, and the half-hours of an evening there. */
export const distant: Station = {
  ...station,
  frequencyHz: 560_000,
  latitude: 45.4,
  powerDayW: 50_000,
  powerNightW: 50_000,
};
export const evening = Array.from(
  { length: 16 },
  (_, half) => new Date(Date.UTC(2026, 2, 20, 20, 30 * half)),
);

/** A set with one circuit of Q 80 and an IF of 455 kHz; 1521 kHz is 1 kHz from the image of 612. */
export const imageAtSite = {
  receiver: plainReceiver(),
  site: siteIn(1),
  raster: defaultRaster(1),
  ...givenStations([[1_521_000, 90]]),
};

/** An image in the IF, 1 kHz beside the wanted carrier. */
export const image: UnwantedCarrier = {
  cause: 'image',
  name: 'image',
  station: 0,
  frequencyHz: 1_521_000,
  n: 1,
  inIfHz: 454_000,
  moves: -1,
  levelDb: 60,
};

/** Two candidates of which the first has the smaller deficit. */
export const candidates: readonly Orderable[] = [3, 10].map((deficitDb, index) => ({
  ifHz: 450_000 + 10_000 * index,
  reachable: { ok: true },
  deficitDb,
  harmonics: [],
}));

/** 550 to 1600 kHz with an IF of 455 kHz, oscillator above, and a gang of 40 to 400 pF. */
export const tracked = { lowHz: 550e3, highHz: 1600e3, signedIfHz: 455e3 };
export const trackedGang = {
  gangMinF: 40e-12,
  gangMaxF: 400e-12,
  strayF: 0,
  trimmer: 'gang' as const,
  points: [600e3, 1000e3, 1400e3] as [number, number, number],
};
export const plain = plainCircuit(550e3, 1600e3, { minF: 40e-12, maxF: 400e-12 });
export const constants = trackingConstants(trackedGang.points, 455e3);
export const padded = paddedCircuit(plain, constants, 'gang', 0);
