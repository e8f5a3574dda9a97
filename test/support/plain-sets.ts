/** Plain receivers, sites and lists for the engine's tests. */
import type { FieldStrength } from '../../shared/radio/propagation/field-strength.ts';
import type { Band, Receiver } from '../../shared/radio/receiver.ts';
import type { ItuRegion, Site } from '../../shared/radio/site.ts';
import type { Station } from '../../shared/radio/station.ts';

/** A band with nothing special about it. */
export function plainBand(over: Partial<Band> = {}): Band {
  return {
    name: 'medium wave',
    lowHz: 550_000,
    highHz: 1_600_000,
    oscillator: 'above',
    circuits: [{ qLow: 80, qHigh: 80 }],
    oscillatorHarmonic: 1,
    service: 'broadcast',
    assumedWantedDb: null,
    tuningToleranceHz: null,
    dialStepHz: null,
    tracking: null,
    ...over,
  };
}

/** A receiver with nothing special about it. */
export function plainReceiver(over: Partial<Receiver> = {}): Receiver {
  return {
    name: 'plain',
    ifHz: 455_000,
    selectivity: { kind: 'widths', b6Hz: 6_000, b60Hz: 22_000 },
    audioCornerHz: 3_500,
    strayDb: null,
    ifFeedthroughDb: 3,
    signalToOscillatorDb: -40,
    ifRange: 0.06,
    fixedFilter: null,
    bfo: null,
    trap: null,
    aerial: null,
    secondConversion: null,
    bands: [plainBand()],
    ...over,
  };
}

/** A receiver of one band with equal circuits. */
export function oneBandReceiver(set: {
  readonly ifHz: number;
  readonly lowHz: number;
  readonly highHz: number;
  readonly circuits: number;
  readonly q: number;
  readonly widths: readonly number[];
}): Receiver {
  const { ifHz, lowHz, highHz, circuits, q } = set;
  const [b6Hz = NaN, b60Hz = NaN] = set.widths;
  const equal = Array.from({ length: circuits }, () => ({ qLow: q, qHigh: q }));
  return plainReceiver({
    ifHz,
    selectivity: { kind: 'widths', b6Hz, b60Hz },
    bands: [plainBand({ lowHz, highHz, circuits: equal })],
  });
}

/** A site in a residential street, or with a noise floor of its own. */
export function siteIn(ituRegion: ItuRegion, over: Partial<Site> = {}): Site {
  return {
    latitude: null,
    longitude: null,
    ground: null,
    noise: 'residential',
    indoors: false,
    noiseFloorDb: null,
    ituRegion,
    ...over,
  };
}

/** Stations of given frequency and field, numbered from 0. */
export function givenStations(list: readonly (readonly [hz: number, db: number])[]): {
  stations: Station[];
  fields: FieldStrength[];
} {
  const stations = list.map(([frequencyHz, fieldDb], id) => ({
    id,
    name: `station ${id}`,
    frequencyHz,
    latitude: null,
    longitude: null,
    powerDayW: null,
    powerNightW: null,
    fieldDb,
  }));
  const fields = stations.map(({ id, fieldDb }) => ({
    station: id,
    distanceM: null,
    groundDb: fieldDb,
    skyDb: null,
    fieldDb,
    notes: [],
  }));
  return { stations, fields };
}
