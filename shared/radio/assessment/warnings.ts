/**
 * What a user should know before trusting an assessment.
 *
 * Source: common practice.
 *
 * @module radio/assessment/warnings
 */
import { primaryRefusal } from '../circuits/aerial.ts';
import type { Receiver } from '../receiver.ts';
import { secondConversionWarning } from '../mixing/second-conversion.ts';
import { type IfSelectivity, shapeFactorWarning } from '../circuits/selectivity.ts';
import type { Period, Site } from '../site.ts';
import type { Spectrum } from '../channels/spectrum.ts';
import { tuningOf } from '../tracking/tuning.ts';

/** Something the user should know about the input; `path` names the field. */
export interface Warning {
  readonly path: string;
  readonly message: string;
}

/** What is looked at. */
export interface WarningInput {
  readonly receiver: Receiver;
  readonly selectivity: IfSelectivity;
  readonly site: Site;
  readonly period: Period;
  readonly spectrum: Spectrum;
  readonly maxM: number;
}

/** Lowest frequency of ITU-R P.372's man-made noise, hertz. */
const NOISE_FROM_HZ = 300_000;
/** Range of the sky-wave model, hertz. */
const SKY_WAVE_HZ = { low: 150_000, extrapolatedBelow: 535_000, high: 1_710_000 };
/** Above this a receiver does more than mix, dB(uV/m). */
const STRONG_SIGNAL_DB = 100;
/** Stray pick-up that is assumed unless it was measured, dB. */
const ASSUMED_STRAY_DB = 60;

/**
 * Gathers the warnings.
 *
 * @param input The receiver and where it stands.
 * @returns The warnings, each with the path of the field it is about.
 */
export function warningsOf(input: WarningInput): Warning[] {
  return [...receiverWarnings(input), ...bandWarnings(input), ...siteWarnings(input)];
}

function receiverWarnings({ receiver, selectivity }: WarningInput): Warning[] {
  const { ifHz, bands, strayDb, fixedFilter } = receiver;
  const inside = bands.find(({ lowHz, highHz }) => ifHz >= lowHz && ifHz <= highHz);
  const second = secondConversionWarning(receiver, selectivity.b6Hz / 2);
  const shape = shapeFactorWarning(selectivity, fixedFilter);
  return [
    ...when(
      inside !== undefined,
      'ifHz',
      () =>
        `The IF lies inside the band ${inside?.name ?? ''}: the set cannot be used near ` +
        `${ifHz / 1000} kHz.`,
    ),
    ...when(second !== null, 'secondConversion', () => second ?? ''),
    ...when(shape !== null, 'selectivity', () => shape ?? ''),
    ...when(
      strayDb?.if === ASSUMED_STRAY_DB && strayDb.image === ASSUMED_STRAY_DB,
      'strayDb',
      () =>
        `Stray pick-up past the tuned circuits is taken as ${ASSUMED_STRAY_DB} dB down, a typical ` +
        'figure; a measured one is better.',
    ),
  ];
}

function bandWarnings({ receiver, site, maxM }: WarningInput): Warning[] {
  return receiver.bands.flatMap((band, index) => [
    ...trackingWarning(receiver, index),
    ...when(
      primaryRefusal(receiver.aerial, band) !== null,
      'aerial',
      () => `${band.name}: ${primaryRefusal(receiver.aerial, band) ?? ''}`,
    ),
    ...when(
      band.oscillatorHarmonic > maxM,
      `bands.${index}.oscillatorHarmonic`,
      () =>
        `Images come by the oscillator's harmonic ${band.oscillatorHarmonic}, beyond the highest ` +
        `order asked for (maxM ${maxM}): they are left out.`,
    ),
    ...when(
      site.noiseFloorDb === null && band.lowHz < NOISE_FROM_HZ,
      `bands.${index}.lowHz`,
      () => 'The noise model begins at 300 kHz; below, it is extrapolated.',
    ),
  ]);
}

function trackingWarning({ ifHz, bands }: Receiver, index: number): Warning[] {
  const band = bands[index];
  const refused = band === undefined ? null : tuningOf(band, ifHz, ifHz).refused;
  return when(
    refused !== null,
    `bands.${index}.tracking`,
    () => `${refused} Tracking is left out on this band.`,
  );
}

function siteWarnings({ site, period, spectrum, receiver }: WarningInput): Warning[] {
  const computed = spectrum.hz.filter((_, group) => spectrum.given[spectrum.startOf(group)] === 0);
  const night = period === 'night';
  const low = receiver.bands.some(({ lowHz }) => lowHz < 1_000_000);
  const strong = spectrum.fieldDb.some((fieldDb) => fieldDb > STRONG_SIGNAL_DB);
  const extrapolated = computed.some((hz) => hz < SKY_WAVE_HZ.extrapolatedBelow);
  return [
    ...when(
      night && computed.some((hz) => hz > SKY_WAVE_HZ.high),
      'stations',
      () =>
        'Above 1710 kHz only the ground wave is computed; short-wave stations may be far stronger.',
    ),
    ...when(
      night && extrapolated,
      'stations',
      () => 'The sky-wave model begins at 535 kHz; below, it is extrapolated.',
    ),
    ...when(
      night && low && site.noiseFloorDb === null,
      'site.noise',
      () => 'At night below 1 MHz the atmosphere is often louder than the man-made noise assumed.',
    ),
    ...when(
      strong,
      'stations',
      () =>
        `Above about ${STRONG_SIGNAL_DB} dB(uV/m) a receiver overloads in ways not computed here.`,
    ),
  ];
}

function when(condition: boolean, path: string, message: () => string): Warning[] {
  return condition ? [{ path, message: message() }] : [];
}
