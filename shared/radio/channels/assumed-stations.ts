/**
 * A list for those who have none: the same field on every channel.
 *
 * Source: own rule.
 *
 * @module radio/channels/assumed-stations
 */
import { rasterChannels } from './raster.ts';
import type { RasterRange, Station } from '../station.ts';

/**
 * Stations of one given field on every channel of a raster.
 *
 * @param raster Ranges of the raster.
 * @param fieldDb Field of each at the site, dB(uV/m).
 * @returns Stations numbered from 0, ascending by frequency.
 *
 * @example
 *   stationsOnEveryChannel(defaultRaster(2), 70).length; // 117
 */
export function stationsOnEveryChannel(raster: readonly RasterRange[], fieldDb: number): Station[] {
  return rasterChannels(raster, 0, Infinity).map((frequencyHz, id) => ({
    id,
    name: `${frequencyHz / 1000} kHz`,
    frequencyHz,
    latitude: null,
    longitude: null,
    powerDayW: null,
    powerNightW: null,
    fieldDb,
  }));
}
