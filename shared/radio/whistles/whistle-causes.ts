/**
 * Possible causes of a whistle at a dial setting.
 *
 * Source: arithmetic; the slope tells causes apart, common practice.
 *
 * @module radio/whistles/whistle-causes
 */
import type { BandScan } from '../assessment/band-scan.ts';
import type { FieldStrength } from '../propagation/field-strength.ts';
import { nearestChannel } from '../channels/raster.ts';
import type { Receiver } from '../receiver.ts';
import { bandScans, WeightingTables } from '../assessment/receiver-at-site.ts';
import { ifSelectivity } from '../circuits/selectivity.ts';
import { tuningTolerance } from '../hearing/service-figures.ts';
import type { Site } from '../site.ts';
import { Spectrum } from '../channels/spectrum.ts';
import type { RasterRange, Station } from '../station.ts';
import { sideSign } from '../mixing/superheterodyne.ts';
import { tuningOf } from '../tracking/tuning.ts';
import { ownCarriers, pairCarriers, stationCarriers, type StillDial } from './whistle-carriers.ts';
import type { UnwantedCarrier, WhistleCause } from './whistle-cause.ts';
import { type HeardWhistle, orderCauses } from './whistle-order.ts';
import { whistleTest } from './whistle-test.ts';

/** Nobody hears a tone above this, hertz. */
const HIGHEST_PITCH_HZ = 16_000;
/** No answer lists more causes. */
const MOST = 100;

/** What is asked. */
export interface WhistleInput extends HeardWhistle {
  readonly receiver: Receiver;
  readonly site: Site;
  readonly stations: readonly Station[];
  /** Fields of the stations at the site, by `fieldStrengths`. */
  readonly fields: readonly FieldStrength[];
  readonly raster: readonly RasterRange[];
  readonly dialHz: number;
}

/** The station that is listened to. */
export interface ListenedTo {
  /** Null: none is listed here that is strong enough; a field is assumed. */
  readonly station: number | null;
  readonly frequencyHz: number;
  readonly fieldDb: number;
}

/** The answer. */
export interface Whistles {
  readonly wanted: ListenedTo;
  /** Noise at the dial setting in the set's bandwidth, dB(uV/m). */
  readonly noiseDb: number;
  /** The most likely first. */
  readonly causes: readonly WhistleCause[];
}

/** The carrier that everything else beats with, in the IF. */
interface Reference {
  readonly inIfHz: number;
  readonly moves: number;
}

/**
 * Finds what may whistle at a dial setting.
 *
 * Two carriers in the IF beat: `pitch = |x - x0|`. A station on f lies at `x0 = IF + s (fs - f)` and
 * moves by s with the dial; an unwanted carrier moves by +m/h, -m/h or not at all. The pitch moves
 * by the difference: 2 Hz a hertz for an image, 1 for breakthrough, `m/h + 1` or `|m/h - 1|` for
 * other products, 0 for a station next to the wanted one, k for the k-th harmonic of the IF. For
 * telegraphy and beacons the beat oscillator is x0, which stands still.
 *
 * The level is that of the tone relative to full modulation of the wanted carrier: the difference
 * of both behind the IF amplifier, less the audio stage's loss at the pitch.
 *
 * @param input Receiver, site, stations with their fields, raster, dial setting and what was heard.
 * @returns The station listened to, and the causes in the order of `orderCauses`.
 * @throws {RangeError} If no band tunes the dial setting.
 *
 * @example
 *   // Q 80, IF 455 kHz, oscillator above; 1521 kHz is 1 kHz from the image of 612 kHz.
 *   whistleCauses({ ...imageAtSite, dialHz: 612_000, pitchHz: null, pitchSlope: null })
 *     .causes[0]; // { cause: 'image', pitchHz: 1000, slope: 2 }
 */
export function whistleCauses(input: WhistleInput): Whistles {
  const { receiver, dialHz } = input;
  const scan = scanAt(input);
  const wanted = listenedTo(input, scan);
  const row = scan.dial.lend(dialHz);
  const still: StillDial = { receiver, scan, dialHz, row, wantedHz: wanted.frequencyHz };
  const side = sideSign(scan.dial.band.oscillator);
  const offset = side * (dialHz - wanted.frequencyHz);
  const carrierDb = wanted.fieldDb - scan.dial.ifRejectionDb(offset);
  const reference = referenceOf(receiver, scan, { inIfHz: receiver.ifHz + offset, moves: side });
  const causes = [...stationCarriers(still), ...ownCarriers(still), ...pairCarriers(still)]
    .map((carrier) => causeOfBeat(carrier, reference, carrierDb, receiver.audioCornerHz))
    .filter(({ pitchHz, slope }) => pitchHz <= HIGHEST_PITCH_HZ && (pitchHz > 0 || slope > 0));
  const toleranceHz = tuningTolerance(scan.dial.band, dialHz);
  const noiseDb = scan.dial.noiseDb[row] ?? NaN;
  return { wanted, noiseDb, causes: orderCauses(causes, input, toleranceHz).slice(0, MOST) };
}

/** The first band that tunes the setting, its circuits where the tracking leaves them. */
function scanAt({ receiver, site, stations, fields, raster, dialHz }: WhistleInput): BandScan {
  const isHere = ({ lowHz, highHz }: { lowHz: number; highHz: number }): boolean =>
    dialHz >= lowHz && dialHz <= highHz;
  const band = receiver.bands.find(isHere);
  if (band === undefined) throw new RangeError(`dialHz: no band tunes ${dialHz} Hz`);
  const selectivity = ifSelectivity(receiver.selectivity, receiver.ifHz);
  const tables = new WeightingTables(receiver, selectivity, site.ituRegion);
  const spectrum = new Spectrum(stations, fields);
  const [scan] = bandScans({ ...receiver, bands: [band] }, site, raster, spectrum, tables);
  if (scan === undefined) throw new RangeError(`dialHz: no band tunes ${dialHz} Hz`);
  scan.dial.retune(tuningOf(band, receiver.ifHz, receiver.ifHz).tuning);
  return scan;
}

/**
 * The strongest listed station within half of B6 behind the IF amplifier; else a field is assumed
 * on the nearest channel within that reach, else on the dial setting itself.
 */
function listenedTo({ receiver, raster, dialHz }: WhistleInput, scan: BandScan): ListenedTo {
  const { dial } = scan;
  const { spectrum } = dial;
  const reach = ifSelectivity(receiver.selectivity, receiver.ifHz).b6Hz / 2;
  const near = (hz: number): boolean => Math.abs(hz - dialHz) <= reach;
  const heardDb = (row: number): number =>
    (dial.wantedDb[row] ?? NaN) - dial.ifRejectionDb((dial.hz[row] ?? NaN) - dialHz);
  const row = Array.from(dial.usableRows)
    .filter((each) => near(dial.hz[each] ?? NaN))
    .reduce((best, each) => (best < 0 || heardDb(each) > heardDb(best) ? each : best), -1);
  if (row >= 0) {
    return {
      station: spectrum.ids[dial.wanted[row] ?? -1] ?? null,
      frequencyHz: dial.hz[row] ?? NaN,
      fieldDb: dial.wantedDb[row] ?? NaN,
    };
  }
  const channel = nearestChannel(raster, dialHz);
  const frequencyHz = channel !== null && near(channel) ? channel : dialHz;
  return { station: null, frequencyHz, fieldDb: dial.wantedDb[dial.lend(frequencyHz)] ?? NaN };
}

/** The wanted carrier, or the beat oscillator where one is listened with. */
function referenceOf({ bfo }: Receiver, { dial }: BandScan, carrier: Reference): Reference {
  const { service } = dial.band;
  const byTone = service === 'telegraphy' || service === 'beacon';
  return byTone && bfo !== null ? { inIfHz: bfo.centreHz + bfo.pitchHz, moves: 0 } : carrier;
}

function causeOfBeat(
  carrier: UnwantedCarrier,
  reference: Reference,
  wantedDb: number,
  audioCornerHz: number | null,
): WhistleCause {
  const { cause, name, station, secondStation, frequencyHz, levelDb } = carrier;
  const pitchHz = Math.round(Math.abs(carrier.inIfHz - reference.inIfHz));
  const slope = Math.abs(carrier.moves - reference.moves);
  const audioDb = audioCornerHz === null ? 0 : 10 * Math.log10(1 + (pitchHz / audioCornerHz) ** 4);
  return {
    cause,
    name,
    station,
    ...(secondStation === undefined ? {} : { secondStation }),
    frequencyHz,
    pitchHz,
    slope,
    levelDb: levelDb === null ? null : levelDb - wantedDb - audioDb,
    test: whistleTest(carrier, slope),
  };
}
