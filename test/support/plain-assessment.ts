/**
 * The slow, plain way to judge a receiver: every product of every station is followed over every
 * dial setting by multiplying out frequencies, with no sorting, tables or shortcuts. It is the
 * oracle for the engine's closed-form solver and shares no code with it.
 */
import type { Band, Receiver, SelectivityWidths } from '../../shared/radio/receiver.ts';
import type { Period, Site } from '../../shared/radio/site.ts';
import type { RasterRange } from '../../shared/radio/station.ts';

export interface PlainStation {
  readonly id: number;
  readonly frequencyHz: number;
  /** Field of ground and sky wave together, or as given. */
  readonly fieldDb: number;
  /** Field by ground wave alone, or as given. */
  readonly groundDb: number;
  /** Whether the field was given rather than computed. */
  readonly given: boolean;
}

export interface PlainCase {
  readonly receiver: Receiver;
  readonly site: Site;
  readonly stations: readonly PlainStation[];
  readonly raster: readonly RasterRange[];
  readonly period: Period;
  readonly maxM: number;
  readonly maxN: number;
}

export interface PlainResponse {
  readonly band: number;
  readonly station: number;
  readonly m: number;
  readonly n: number;
  readonly dialHz: number;
  readonly beatHz: number;
  readonly interferenceDb: number;
  readonly weightingDb: number;
  readonly wantedDb: number;
  readonly wantedStation: number | null;
  readonly noiseDb: number;
  readonly bandDb: number | null;
  readonly ratioDb: number;
  readonly marginDb: number;
  readonly grade: string;
  readonly hidden: 'noise' | 'band' | null;
  readonly borderline: boolean;
}

const log = (x: number) => 10 * Math.log10(x);
const power = (db: number) => 10 ** (db / 10);

const NOISE = {
  city: [76.8, 27.7],
  residential: [72.5, 27.7],
  rural: [67.2, 27.7],
  quiet: [53.6, 28.6],
} as const;

function ifSelectivity({ b6Hz, b60Hz }: SelectivityWidths, offset: number): number {
  const order = Math.log((1e6 - 1) / (10 ** 0.6 - 1)) / (2 * Math.log(b60Hz / b6Hz));
  const ratio = (2 * Math.abs(offset)) / b6Hz;
  return Math.min(90, log(1 + (10 ** 0.6 - 1) * ratio ** (2 * order)));
}

function ear(f: number): number {
  const h1 =
    -4.737338981378384e-24 * f ** 6 +
    2.043828333606125e-15 * f ** 4 -
    1.363894795463638e-7 * f ** 2 +
    1;
  const h2 =
    1.306612257412824e-19 * f ** 5 - 2.118150887518656e-11 * f ** 3 + 5.559488023498642e-4 * f;
  return 18.2 + 20 * Math.log10((1.246332637532143e-4 * f) / Math.hypot(h1, h2));
}

const CENTRES = [
  100, 125, 160, 200, 250, 315, 400, 500, 630, 800, 1000, 1250, 1600, 2000, 2500, 3150, 4000, 5000,
  6300, 8000, 10000,
];

function weightingWithoutTolerance(it: PlainCase, band: Band, beat: number): number {
  const widths = it.receiver.selectivity as SelectivityWidths;
  if (band.service === 'telegraphy' || band.service === 'beacon') {
    const pitch = it.receiver.bfo?.pitchHz ?? 1000;
    const tones = [Math.abs(beat - pitch), beat + pitch].map((f) => (f === 0 ? -Infinity : ear(f)));
    return -ifSelectivity(widths, beat) + Math.max(...tones) - ear(pitch);
  }
  const corner = it.receiver.audioCornerHz;
  const heard = (d: number) => {
    const f = Math.abs(d);
    if (f === 0) return 0;
    const audio = corner === null ? 0 : log(1 + (f / corner) ** 4);
    return power(-ifSelectivity(widths, f) - audio + ear(f));
  };
  const limit = it.site.ituRegion === 2 ? 10_000 : 4_500;
  const centres = CENTRES.filter((f) => f <= limit);
  const weights = centres.map((f) => f * Math.min(1, (600 / f) ** 2));
  const sum = weights.reduce((a, b) => a + b, 0);
  const shares = weights.map((w) => w / sum);
  const programme = (of: (f: number) => number) =>
    centres.reduce((total, f, j) => total + (shares[j] ?? 0) * of(f), 0);
  const reference = programme(heard);
  const kappa = beat < 50 ? 1 / 2 : 1 / 4;
  const sidebands = (kappa * programme((f) => heard(beat - f) + heard(beat + f))) / reference;
  const carrier = beat < 50 ? 0 : (10 ** 0.74 * heard(beat)) / reference;
  return log(carrier + sidebands);
}

const remembered = new WeakMap<PlainCase, Map<string, number>>();

function weighting(it: PlainCase, band: Band, dial: number, beat: number): number {
  const tolerance = band.tuningToleranceHz ?? (dial < 2e6 ? 1000 : dial < 10e6 ? 2000 : 4000);
  const tables = remembered.get(it) ?? new Map<string, number>();
  remembered.set(it, tables);
  const at = (multiple: number) => {
    const f = Math.abs(multiple) * 100;
    const key = `${band.service}/${f}`;
    const known = tables.get(key);
    if (known !== undefined) return known;
    const value = weightingWithoutTolerance(it, band, f);
    tables.set(key, value);
    return value;
  };
  const first = Math.ceil((beat - tolerance) / 100 - 1e-9);
  const last = Math.floor((beat + tolerance) / 100 + 1e-9);
  if (first > last) return at(Math.floor(beat / 100 + 0.5));
  let largest = -Infinity;
  for (let multiple = first; multiple <= last; multiple++)
    largest = Math.max(largest, at(multiple));
  return largest;
}

function circuits(band: Band, dial: number, f: number): number {
  const rho = f / dial - dial / f;
  return band.circuits.reduce((sum, { qLow, qHigh }) => {
    const q = qLow + ((qHigh - qLow) * (dial - band.lowHz)) / (band.highHz - band.lowHz);
    return sum + log(1 + (q * rho) ** 2);
  }, 0);
}

function trapLoss({ trap }: Receiver, f: number): number {
  if (trap === null) return 0;
  const { inductanceH: l, capacitanceF: c, q, sourceOhms: rs, loadOhms: rl } = trap;
  const w = 2 * Math.PI * f;
  const w0 = 1 / Math.sqrt(l * c);
  if (trap.kind === 'parallel') {
    const [g, b] = [1 / (q * w0 * l), w * c - 1 / (w * l)];
    const [re, im] = [g / (g * g + b * b), -b / (g * g + b * b)];
    return 20 * Math.log10(Math.hypot(1 + re / (rs + rl), im / (rs + rl)));
  }
  const [r, x] = [(w0 * l) / q, w * l - 1 / (w * c)];
  const parallel = (rs * rl) / (rs + rl);
  const size = r * r + x * x;
  return 20 * Math.log10(Math.hypot(1 + (parallel * r) / size, (parallel * x) / size));
}

function noise(it: PlainCase, f: number): number {
  if (it.site.noiseFloorDb !== null) return it.site.noiseFloorDb;
  const [c, d] = NOISE[it.site.noise ?? 'residential'];
  const mhz = Math.log10(f / 1e6);
  const b6 = (it.receiver.selectivity as SelectivityWidths).b6Hz;
  return c - d * mhz + 20 * mhz + log(b6) - 95.5 + (it.site.indoors ? 25 : 0);
}

function assumedField(it: PlainCase, band: Band, f: number): number {
  if (band.assumedWantedDb !== null) return band.assumedWantedDb;
  if (band.service === 'beacon') return 37;
  if (band.service === 'marine') return 28;
  if (band.service === 'telegraphy') return 20;
  if (f < 300e3) return 66;
  if (f < 1.8e6) return it.site.ituRegion === 2 ? 54 : 60;
  return 40;
}

function protection(it: PlainCase, band: Band): number {
  if (band.service === 'broadcast') return it.site.ituRegion === 2 ? 26 : 30;
  return band.service === 'marine' ? 17 : 15;
}

/** The usable station on a dial setting, if there is one. */
export function wantedAt(it: PlainCase, dial: number): PlainStation | null {
  let best: PlainStation | null = null;
  for (const station of it.stations) {
    if (station.frequencyHz !== dial) continue;
    if (best === null || station.groundDb > best.groundDb) best = station;
  }
  return best !== null && best.groundDb >= noise(it, dial) + 26 ? best : null;
}

function gradeOf(band: Band, ratio: number, margin: number): string {
  const [value, steps] =
    band.service === 'broadcast' ? [ratio, [40, 30, 26, 17]] : [margin, [14, 4, 0, -9]];
  const words = ['imperceptible', 'perceptible', 'slightly-annoying', 'annoying'];
  const place = steps.findIndex((step) => value >= step);
  return place < 0 ? 'very-annoying' : (words[place] ?? '');
}

function judge(
  it: PlainCase,
  bandIndex: number,
  station: PlainStation,
  [m, n]: readonly [number, number],
  dial: number,
  beat: number,
): PlainResponse {
  const band = it.receiver.bands[bandIndex] as Band;
  const { receiver } = it;
  const reach = (receiver.selectivity as SelectivityWidths).b60Hz / 2;
  const harmonics = [receiver.ifFeedthroughDb, 0, -6, -10, -14, -17];
  const orders = [0, 0, -15, -30];
  const f = station.frequencyHz;
  const a = circuits(band, dial, f) + trapLoss(receiver, f) - trapLoss(receiver, dial);
  const g = station.fieldDb - a;
  let i =
    g +
    (harmonics[m] ?? NaN) -
    (m === 0 ? 0 : (harmonics[band.oscillatorHarmonic] ?? NaN)) +
    (orders[n] ?? NaN) +
    (n - 1) * (receiver.signalToOscillatorDb + g - 80);
  if (n === 1 && receiver.strayDb !== null) {
    i = Math.max(i, station.fieldDb - (m === 0 ? receiver.strayDb.if : receiver.strayDb.image));
  }
  const w = weighting(it, band, dial, beat);
  const wanted = wantedAt(it, dial);
  const s = wanted?.groundDb ?? assumedField(it, band, dial);
  const noiseDb = noise(it, dial);
  let bandPower = 0;
  let some = false;
  for (const other of it.stations) {
    if (other === wanted || other === station) continue;
    const distance = Math.abs(other.frequencyHz - dial);
    if (distance > reach) continue;
    some = true;
    bandPower += power(other.fieldDb + weighting(it, band, dial, distance));
  }
  const heard = i + w;
  const hidden =
    heard <= noiseDb - 6
      ? 'noise'
      : some && heard <= log(power(noiseDb) + bandPower) - 6
        ? 'band'
        : null;
  const ratioDb = s - heard;
  const marginDb = ratioDb - protection(it, band);
  const sigmaField = station.given ? 0 : it.period === 'day' ? 6 : 8;
  const sigma = Math.hypot(n * sigmaField, 4 * n * band.circuits.length, wanted === null ? 0 : 6);
  return {
    band: bandIndex,
    station: station.id,
    m,
    n,
    dialHz: dial,
    beatHz: beat,
    interferenceDb: i,
    weightingDb: w,
    wantedDb: s,
    wantedStation: wanted?.id ?? null,
    noiseDb,
    bandDb: some ? log(bandPower) : null,
    ratioDb,
    marginDb,
    grade: hidden === null ? gradeOf(band, ratioDb, marginDb) : 'hidden',
    hidden,
    borderline: Math.abs(marginDb) < sigma,
  };
}

function channels(it: PlainCase, band: Band): number[] {
  const all = it.raster.flatMap(({ lowHz, highHz, stepHz }) =>
    Array.from({ length: Math.floor((highHz - lowHz) / stepHz) + 1 }, (_, k) => lowHz + k * stepHz),
  );
  return all.filter((f) => f >= band.lowHz && f <= band.highHz);
}

/** Dial settings at which a moving product of one station is judged, and the beat at each. */
function movingSettings(
  it: PlainCase,
  band: Band,
  station: PlainStation,
  m: number,
  n: number,
): Map<number, number> {
  const reach = (it.receiver.selectivity as SelectivityWidths).b60Hz / 2;
  const side = band.oscillator === 'above' ? 1 : -1;
  const h = band.oscillatorHarmonic;
  const f = station.frequencyHz;
  const within = (dial: number) => dial >= band.lowHz && dial <= band.highHz;
  const found = new Map<number, number>();
  const { ifHz } = it.receiver;
  for (const product of [n * f + ifHz, n * f - ifHz, ifHz - n * f]) {
    if (product <= 0) continue;
    const solution = (product * h) / m - side * ifHz;
    if (!within(solution)) continue;
    if (m === h && n === 1 && solution === f) continue;
    const near = (x: number) => Math.abs(x - solution) <= reach && within(x) && x !== f;
    let settings = [...new Set(it.stations.map(({ frequencyHz }) => frequencyHz))].filter(near);
    if (settings.length === 0) {
      const reachable = channels(it, band).filter(near);
      reachable.sort((x, y) => Math.abs(x - solution) - Math.abs(y - solution) || x - y);
      settings = reachable.slice(0, 1);
    }
    if (settings.length === 0 && solution !== f) settings = [solution];
    for (const dial of settings) {
      const beat = (m / h) * Math.abs(dial - solution);
      found.set(dial, Math.min(beat, found.get(dial) ?? Infinity));
    }
  }
  return found;
}

function breakthrough(
  it: PlainCase,
  bandIndex: number,
  station: PlainStation,
  n: number,
): PlainResponse | null {
  const band = it.receiver.bands[bandIndex] as Band;
  const beat = Math.abs(n * station.frequencyHz - it.receiver.ifHz);
  if (beat > (it.receiver.selectivity as SelectivityWidths).b60Hz / 2) return null;
  const listed = it.stations
    .map(({ frequencyHz }) => frequencyHz)
    .filter((f) => f >= band.lowHz && f <= band.highHz);
  const settings = [band.lowHz, band.highHz, ...channels(it, band), ...listed]
    .filter((dial) => dial !== station.frequencyHz)
    .sort((x, y) => x - y);
  let worst: PlainResponse | null = null;
  for (const dial of settings) {
    const judged = judge(it, bandIndex, station, [0, n], dial, beat);
    if (worst === null || judged.ratioDb < worst.ratioDb - 1e-9) worst = judged;
  }
  return worst;
}

/**
 * Every response of every station in every band, hidden ones too, in no promised order.
 * @param interferers The stations whose products are followed; left out, all of the list.
 */
export function plainResponses(
  it: PlainCase,
  interferers: readonly PlainStation[] = it.stations,
): PlainResponse[] {
  return it.receiver.bands.flatMap((band, bandIndex) =>
    interferers.flatMap((station) => {
      const all: PlainResponse[] = [];
      for (let n = 1; n <= it.maxN; n++) {
        const still = breakthrough(it, bandIndex, station, n);
        if (still !== null) all.push(still);
        for (let m = 1; m <= it.maxM; m++) {
          for (const [dial, beat] of movingSettings(it, band, station, m, n)) {
            all.push(judge(it, bandIndex, station, [m, n], dial, beat));
          }
        }
      }
      return all;
    }),
  );
}

/** Usable stations, harmed ones and the deficit in decibels, from the responses. */
export function plainVerdict(it: PlainCase, responses: readonly PlainResponse[]) {
  const usable = new Set<number>();
  const harmed = new Set<number>();
  let deficitDb = 0;
  it.receiver.bands.forEach((band, index) => {
    const p0 = protection(it, band);
    const heard = responses.filter((each) => each.band === index && each.hidden === null);
    const frequencies = new Set(it.stations.map(({ frequencyHz }) => frequencyHz));
    for (const dial of frequencies) {
      const wanted = dial >= band.lowHz && dial <= band.highHz ? wantedAt(it, dial) : null;
      if (wanted === null) continue;
      usable.add(wanted.id);
      const here = heard.filter((each) => each.dialHz === dial);
      if (here.length === 0) continue;
      const sum = here.reduce((t, each) => t + power(each.interferenceDb + each.weightingDb), 0);
      const ratio = wanted.groundDb - log(sum);
      if (ratio < p0) harmed.add(wanted.id);
      deficitDb += Math.max(0, p0 - ratio);
    }
    const empty = heard.filter((each) => each.m === 0 && each.wantedStation === null);
    if (empty.length > 0) {
      deficitDb += Math.max(0, p0 - Math.min(...empty.map(({ ratioDb }) => ratioDb)));
    }
  });
  return { usable: usable.size, harmed: [...harmed].sort((a, b) => a - b), deficitDb };
}
