/**
 * Carriers in the IF amplifier while the dial stands still.
 *
 * Source: arithmetic; levels as in `assess`.
 *
 * @module radio/whistles/whistle-carriers
 */
import type { BandScan } from '../assessment/band-scan.ts';
import { intermodulatingPairs, strongestStations } from '../mixing/intermodulation.ts';
import { MAX_OSCILLATOR_ORDER, MAX_SIGNAL_ORDER } from '../mixing/product-levels.ts';
import { causeOf, productName } from '../assessment/product-names.ts';
import type { Receiver } from '../receiver.ts';
import { secondOscillator } from '../mixing/second-conversion.ts';
import { SIGNAL_PATH, type SignalPath } from '../mixing/signal-path.ts';
import { sideSign } from '../mixing/superheterodyne.ts';
import type { UnwantedCarrier } from './whistle-cause.ts';

const HARMONICS = [1, 2, 3, 4, 5, 6, 7, 8] as const;
/** A carrier that lies this far under the noise is not heard, decibels. */
const HIDDEN_UNDER_DB = 6;

/** A receiver with its dial at rest. */
export interface StillDial {
  readonly receiver: Receiver;
  readonly scan: BandScan;
  readonly dialHz: number;
  /** Row lent to the dial setting. */
  readonly row: number;
  /** Carrier of the station listened to, at the aerial, hertz. */
  readonly wantedHz: number;
}

/** A product of the mixer: `x = o m osc + t n f` in the IF. */
interface Mixed {
  readonly o: 0 | 1 | -1;
  readonly t: 1 | -1;
  readonly relation: 'plus' | 'less' | 'below';
}

const STILL: readonly Mixed[] = [{ o: 0, t: 1, relation: 'less' }];
const MOVING: readonly Mixed[] = [
  { o: 1, t: -1, relation: 'less' },
  { o: -1, t: 1, relation: 'plus' },
  { o: 1, t: 1, relation: 'below' },
];

/**
 * Every station that some product of the mixer brings into the IF at the dial setting, with the
 * stations beside the wanted one.
 *
 *     x = m osc - n f,  n f - m osc  or  m osc + n f;   osc = (fs + s IF)/h
 *
 * x moves by +m/h or -m/h with the dial, the IF carrier of a station on the dial by s.
 *
 * @param still The receiver and its dial.
 * @returns The carriers that are not hidden by noise.
 */
export function stationCarriers(still: StillDial): UnwantedCarrier[] {
  const { receiver, scan } = still;
  const carriers: UnwantedCarrier[] = [];
  scan.dial.spectrum.hz.forEach((_, group) => {
    for (let n = 1; n <= MAX_SIGNAL_ORDER; n++) {
      for (let m = 0; m <= MAX_OSCILLATOR_ORDER; m++) {
        for (const mixed of m === 0 ? STILL : MOVING) {
          const carrier = mixedCarrier(still, group, m, n, mixed);
          if (carrier !== null) carriers.push(carrier);
        }
      }
    }
    if (receiver.secondConversion !== null) carriers.push(...secondCarriers(still, group));
  });
  return carriers;
}

function mixedCarrier(
  still: StillDial,
  group: number,
  m: number,
  n: number,
  { o, t, relation }: Mixed,
): UnwantedCarrier | null {
  const { receiver, dialHz } = still;
  const { band, spectrum } = still.scan.dial;
  const side = sideSign(band.oscillator);
  const stationHz = spectrum.hz[group] ?? NaN;
  const oscillatorHz = (dialHz + side * receiver.ifHz) / band.oscillatorHarmonic;
  const inIfHz = o * m * oscillatorHz + t * n * stationHz;
  if (!isInReach(still, inIfHz)) return null;
  const product = { group, m, n, path: SIGNAL_PATH.first };
  const moves = (o * m) / band.oscillatorHarmonic;
  if (m === band.oscillatorHarmonic && n === 1 && o === side && t === -side) {
    if (stationHz === still.wantedHz) return null;
    const name = 'station beside the wanted one';
    return received(still, product, { inIfHz, moves, cause: 'adjacent-carrier', name });
  }
  const cause = causeOf(m, n, band.oscillatorHarmonic);
  const name = productName(m, n, band.oscillatorHarmonic, relation);
  return received(still, product, { inIfHz, moves, cause, name });
}

/**
 * What only a second conversion takes, as if it lay in the first IF: its image at
 * `x = 2 osc2 - x1`, which moves against the wanted carrier, and a station on the second IF, which
 * does not move.
 */
function secondCarriers(still: StillDial, group: number): UnwantedCarrier[] {
  const { receiver, scan, dialHz } = still;
  const { secondConversion, ifHz } = receiver;
  if (secondConversion === null) return [];
  const { band, spectrum } = scan.dial;
  const side = sideSign(band.oscillator);
  const stationHz = spectrum.hz[group] ?? NaN;
  const osc2Hz = secondOscillator(ifHz, secondConversion);
  const m = band.oscillatorHarmonic;
  const inFirstIf = ifHz + side * (dialHz - stationHz);
  const image = received(
    still,
    { group, m, n: 1, path: SIGNAL_PATH.secondImage },
    {
      inIfHz: 2 * osc2Hz - Math.abs(inFirstIf),
      moves: -side * Math.sign(inFirstIf),
      cause: 'second-image',
      name: 'second image',
    },
  );
  const onSecondIf = sideSign(secondConversion.oscillator) * (secondConversion.ifHz - stationHz);
  const breakthrough = received(
    still,
    { group, m: 0, n: 1, path: SIGNAL_PATH.secondIf },
    {
      inIfHz: ifHz + onSecondIf,
      moves: 0,
      cause: 'breakthrough',
      name: 'breakthrough of the second IF',
    },
  );
  return [image, breakthrough].filter((carrier) => carrier !== null);
}

const isInReach = ({ scan, receiver }: StillDial, inIfHz: number): boolean =>
  inIfHz > 0 && Math.abs(inIfHz - receiver.ifHz) <= scan.dial.reachHz;

interface Product {
  readonly group: number;
  readonly m: number;
  readonly n: number;
  readonly path: SignalPath;
}

/** The carrier, unless it lies outside the IF or under the noise. */
function received(
  still: StillDial,
  product: Product,
  what: Pick<UnwantedCarrier, 'cause' | 'name' | 'moves' | 'inIfHz'>,
): UnwantedCarrier | null {
  if (!isInReach(still, what.inIfHz)) return null;
  const { scan, receiver, row } = still;
  const { dial } = scan;
  const position = dial.spectrum.startOf(product.group);
  const levelDb =
    product.n * (dial.spectrum.fieldDb[position] ?? NaN) +
    scan.shiftDb(product, row) -
    dial.ifRejectionDb(what.inIfHz - receiver.ifHz);
  if (!(levelDb > (dial.noiseDb[row] ?? NaN) - HIDDEN_UNDER_DB)) return null;
  return {
    ...what,
    station: dial.spectrum.ids[position] ?? null,
    frequencyHz: dial.spectrum.hz[product.group] ?? NaN,
    n: product.n,
    levelDb,
  };
}

/** Something in the set that oscillates, or a carrier in it. */
interface Source {
  readonly cause: 'if-harmonic' | 'bfo-harmonic' | 'second-oscillator';
  readonly words: string;
  readonly hz: number;
  /** How it moves with the dial, hertz per hertz. */
  readonly moves: number;
  /** Its lowest harmonic that is looked at. */
  readonly from: number;
}

/**
 * Harmonics made inside the set that come back through the aerial circuits on the dial setting: of
 * the IF carrier, from the detector, of the beat oscillator and of the second oscillator, which may
 * also lie on the first IF itself. Their level cannot be predicted.
 *
 *     x = IF + s (fs - k f);   moves by s - s k (movement of f)
 *
 * The IF carrier moves by s, so its k-th harmonic by `s - k`: against the carrier it beats k times
 * as fast as the tuning.
 *
 * @param still The receiver and its dial.
 * @returns The carriers.
 */
export function ownCarriers(still: StillDial): UnwantedCarrier[] {
  const { receiver, dialHz } = still;
  const side = sideSign(still.scan.dial.band.oscillator);
  return sourcesOf(still).flatMap((source) =>
    HARMONICS.filter((k) => k >= source.from).flatMap((k) => {
      const hz = k * source.hz;
      const name = `harmonic ${k} of the ${source.words}`;
      const what = { cause: source.cause, station: null, n: null, levelDb: null };
      const tuned = {
        ...what,
        name,
        frequencyHz: Math.round(hz),
        inIfHz: receiver.ifHz + side * (dialHz - hz),
        moves: side - side * k * source.moves,
      };
      const onIf = { ...tuned, name: `${name} on the IF`, inIfHz: hz, moves: 0 };
      const carriers = source.cause === 'second-oscillator' ? [tuned, onIf] : [tuned];
      return carriers.filter(({ inIfHz }) => isInReach(still, inIfHz));
    }),
  );
}

function sourcesOf({ receiver, scan, dialHz, wantedHz }: StillDial): Source[] {
  const { ifHz, bfo, secondConversion } = receiver;
  const side = sideSign(scan.dial.band.oscillator);
  const carrierHz = ifHz + side * (dialHz - wantedHz);
  const fixed = { moves: 0, from: 1 };
  const sources: Source[] = [
    { cause: 'if-harmonic', words: 'IF', hz: carrierHz, moves: side, from: 2 },
  ];
  if (bfo !== null) {
    const words = 'beat oscillator';
    sources.push({ cause: 'bfo-harmonic', words, hz: bfo.centreHz, ...fixed });
  }
  if (secondConversion !== null) {
    const hz = secondOscillator(ifHz, secondConversion);
    sources.push({ cause: 'second-oscillator', words: 'second oscillator', hz, ...fixed });
  }
  return sources;
}

/**
 * Pairs of strong stations that make the IF between them: they do not move with the dial. Their
 * level is not computed.
 *
 * @param still The receiver and its dial.
 * @returns The carriers.
 */
export function pairCarriers({ receiver, scan }: StillDial): UnwantedCarrier[] {
  const { spectrum, reachHz } = scan.dial;
  return intermodulatingPairs(strongestStations(spectrum), receiver.ifHz, reachHz).map(
    ({ stronger, weaker, relation }) => ({
      cause: 'intermodulation',
      name: `${relation} of two stations`,
      station: stronger.id,
      secondStation: weaker.id,
      frequencyHz: stronger.hz,
      n: null,
      inIfHz: relation === 'sum' ? stronger.hz + weaker.hz : Math.abs(stronger.hz - weaker.hz),
      moves: 0,
      levelDb: null,
    }),
  );
}
