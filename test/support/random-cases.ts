/** Random receivers, sites and lists for the engine's laws, drawn by fast-check. */
import * as fc from 'fast-check';

import type { FieldStrength } from '../../shared/radio/propagation/field-strength.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { Band, Receiver } from '../../shared/radio/receiver.ts';
import type { Period, Site } from '../../shared/radio/site.ts';
import type { RasterRange, Station } from '../../shared/radio/station.ts';
import type { PlainCase } from './plain-assessment.ts';

const q = fc.integer({ min: 15, max: 150 });

const BAND_LIMITS: [number, number][] = [
  [150_000, 285_000],
  [550_000, 1_600_000],
  [1_600_000, 4_000_000],
  [5_900_000, 9_000_000],
  [520_000, 1_710_000],
];

/** Bands whose oscillator runs at every IF that is drawn here. */
const band: fc.Arbitrary<Band> = fc
  .record({
    limits: fc.constantFrom(...BAND_LIMITS),
    below: fc.boolean(),
    circuits: fc.array(fc.record({ qLow: q, qHigh: q }), { maxLength: 3 }),
    oscillatorHarmonic: fc.constantFrom(1, 1, 1, 2, 3),
    service: fc.constantFrom('broadcast', 'broadcast', 'beacon', 'marine', 'telegraphy'),
    assumedWantedDb: fc.option(fc.integer({ min: 10, max: 70 }), { freq: 3 }),
    tuningToleranceHz: fc.option(fc.constantFrom(0, 250, 1000, 1500), { freq: 3 }),
  })
  .map(({ limits: [lowHz, highHz], below, ...rest }) => ({
    name: `${lowHz / 1000}`,
    lowHz,
    highHz,
    oscillator: below && lowHz > 1_000_000 ? 'below' : 'above',
    dialStepHz: null,
    tracking: null,
    ...rest,
  }));

const widths = fc
  .record({
    b6Hz: fc.integer({ min: 2_000, max: 10_000 }),
    shape: fc.double({ min: 2, max: 7, noNaN: true }),
  })
  .map(({ b6Hz, shape }) => ({ kind: 'widths' as const, b6Hz, b60Hz: Math.round(b6Hz * shape) }));

const trap = fc.record({
  kind: fc.constantFrom('parallel' as const, 'series' as const),
  inductanceH: fc.constantFrom(50e-6, 500e-6),
  capacitanceF: fc.constantFrom(244.7e-12, 1e-9),
  q,
  sourceOhms: fc.constant(400),
  loadOhms: fc.constant(1000),
});

/** Receivers of every shape that has two widths and no second conversion, aerial or tracking. */
export const receivers: fc.Arbitrary<Receiver> = fc.record({
  name: fc.constant('drawn'),
  ifHz: fc.oneof(
    fc.constantFrom(110_000, 455_000, 465_000, 560_000),
    fc.integer({ min: 100_000, max: 600_000 }),
  ),
  selectivity: widths,
  audioCornerHz: fc.constantFrom(null, 3_500),
  strayDb: fc.constantFrom(null, { if: 60, image: 55 }),
  ifFeedthroughDb: fc.constantFrom(3, -20),
  signalToOscillatorDb: fc.constantFrom(-40, -25),
  ifRange: fc.constant(0.06),
  fixedFilter: fc.constant(null),
  bfo: fc.option(
    fc.record({
      centreHz: fc.constant(455_000),
      rangeHz: fc.constant(3_000),
      pitchHz: fc.constantFrom(700, 1_000),
    }),
  ),
  trap: fc.option(trap, { freq: 2 }),
  aerial: fc.constant(null),
  secondConversion: fc.constant(null),
  bands: fc.array(band, { minLength: 1, maxLength: 3 }),
});

export const sites: fc.Arbitrary<Site> = fc.record({
  latitude: fc.constant(null),
  longitude: fc.constant(null),
  ground: fc.constant(null),
  noise: fc.constantFrom('city', 'residential', 'rural', 'quiet'),
  indoors: fc.boolean(),
  noiseFloorDb: fc.option(fc.integer({ min: -5, max: 30 }), { freq: 3 }),
  ituRegion: fc.constantFrom(1, 2, 3),
});

const frequency = fc.oneof(
  fc.integer({ min: 59, max: 178 }).map((k) => k * 9_000),
  fc.integer({ min: 54, max: 170 }).map((k) => k * 10_000),
  fc.integer({ min: 17, max: 31 }).map((k) => k * 9_000),
  fc.integer({ min: 100_000, max: 9_000_000 }),
);

const listOn = (drawn: fc.Arbitrary<number>): fc.Arbitrary<Station[]> =>
  fc
    .array(fc.record({ frequencyHz: drawn, fieldDb: fc.integer({ min: 0, max: 105 }) }), {
      minLength: 1,
      maxLength: 25,
    })
    .map((list) =>
      list.map(({ frequencyHz, fieldDb }, id) => ({
        id,
        name: `station ${id}`,
        frequencyHz,
        latitude: null,
        longitude: null,
        powerDayW: null,
        powerNightW: null,
        fieldDb,
      })),
    );

/** Stations whose fields are given. */
export const stationLists: fc.Arbitrary<Station[]> = listOn(frequency);

/** Several stations on each of a few frequencies, some of which lie within one IF's width. */
export const crowdedLists: fc.Arbitrary<Station[]> = fc
  .array(fc.record({ hz: frequency, offHz: fc.constantFrom(0, 1_000, 4_500, 9_000) }), {
    minLength: 1,
    maxLength: 4,
  })
  .chain((few) => listOn(fc.constantFrom(...few.flatMap(({ hz, offHz }) => [hz, hz + offHz]))));

interface Drawn {
  readonly receiver: Receiver;
  readonly site: Site;
  readonly stations: readonly Station[];
  readonly period: Period;
  readonly maxM: number;
  readonly maxN: number;
}

/**
 * The same case for the plain way and, in `input`, what the engine wants besides. Every third
 * station counts as computed, its ground wave 10 dB below its whole field.
 */
export function plainCase(drawn: Drawn): PlainCase & {
  readonly input: {
    readonly stations: Station[];
    readonly fields: FieldStrength[];
    readonly raster: RasterRange[];
  };
} {
  const raster = defaultRaster(drawn.site.ituRegion);
  const given = (id: number): boolean => id % 3 !== 0;
  const heard = drawn.stations.map(({ id, frequencyHz, fieldDb }) => ({
    id,
    frequencyHz,
    fieldDb: fieldDb ?? NaN,
    groundDb: (fieldDb ?? NaN) - (given(id) ? 0 : 10),
    given: given(id),
  }));
  const stations = drawn.stations.map((station) => ({
    ...station,
    fieldDb: given(station.id) ? station.fieldDb : null,
  }));
  const fields = heard.map(({ id, fieldDb, groundDb }) => ({
    station: id,
    distanceM: given(id) ? null : 1000,
    groundDb,
    skyDb: null,
    fieldDb,
    notes: [],
  }));
  return { ...drawn, stations: heard, raster, input: { stations, fields, raster } };
}
