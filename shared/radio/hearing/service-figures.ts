/**
 * What a listener to a service expects: assumed wanted field, protection ratio, tuning tolerance.
 *
 * Source: GE75 and Rio 1981, 47 CFR 73.37; the others from memory of the literature, not re-read.
 *
 * @module radio/hearing/service-figures
 */
import type { Band, Service } from '../receiver.ts';
import type { ItuRegion } from '../site.ts';

/**
 * Field of the wanted station where none is listed, dB(uV/m).
 *
 * Broadcast below 300 kHz 66, below 1.8 MHz 60 (Region 2: 54), above 40; beacons 37, marine 28,
 * telegraphy 20. From memory of planning and receiver practice, not re-read.
 *
 * @param band Its service and, where the user set one, its assumed field.
 * @param ituRegion ITU Region.
 * @param dialHz Dial setting, hertz.
 * @returns The field, dB(uV/m).
 *
 * @example
 *   assumedWantedField({ service: 'broadcast', assumedWantedDb: null }, 2, 1_000_000); // 54
 */
export function assumedWantedField(
  { service, assumedWantedDb }: Pick<Band, 'service' | 'assumedWantedDb'>,
  ituRegion: ItuRegion,
  dialHz: number,
): number {
  if (assumedWantedDb !== null) return assumedWantedDb;
  if (service === 'beacon') return 37;
  if (service === 'marine') return 28;
  if (service === 'telegraphy') return 20;
  if (dialHz < 300_000) return 66;
  if (dialHz < 1_800_000) return ituRegion === 2 ? 54 : 60;
  return 40;
}

/**
 * Protection ratio of a service, dB.
 *
 * Broadcast 30 in Regions 1 and 3 (GE75, from memory), 26 in Region 2 (Rio 1981; 20:1 in
 * 47 CFR 73.37); beacons and telegraphy 15, marine 17 (from memory, not re-read).
 *
 * @param service Service of the band.
 * @param ituRegion ITU Region.
 * @returns Wanted over interfering level, decibels.
 *
 * @example
 *   protectionRatio('broadcast', 1); // 30
 */
export function protectionRatio(service: Service, ituRegion: ItuRegion): number {
  switch (service) {
    case 'broadcast':
      return ituRegion === 2 ? 26 : 30;
    case 'marine':
      return 17;
    default:
      return 15;
  }
}

/**
 * How far a listener may sit off the centre, hertz: 1 kHz below 2 MHz, 2 below 10 MHz, 4 above.
 *
 * Common practice for free-running sets; 0 suits one locked to a crystal.
 *
 * @param band Where the user set it, its tolerance.
 * @param dialHz Dial setting, hertz.
 * @returns Hertz.
 *
 * @example
 *   tuningTolerance({ tuningToleranceHz: null }, 6_000_000); // 2000
 */
export function tuningTolerance(
  { tuningToleranceHz }: Pick<Band, 'tuningToleranceHz'>,
  dialHz: number,
): number {
  if (tuningToleranceHz !== null) return tuningToleranceHz;
  if (dialHz < 2_000_000) return 1_000;
  return dialHz < 10_000_000 ? 2_000 : 4_000;
}
