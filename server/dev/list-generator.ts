/**
 * Allocation lists of invented stations, of any size, the same for the same plan.
 */
import { rasterChannels } from '../../shared/radio/channels/raster.ts';
import type { RasterRange } from '../../shared/radio/station.ts';
import { callSign, inventedPlace, stationName } from './invented-names.ts';
import { pick, seededRandom } from './random.ts';

/** One line of a list, in the columns and units of the file. */
export interface ListRow {
  readonly name: string;
  readonly call_sign: string;
  readonly frequency_khz: number;
  readonly latitude: number;
  readonly longitude: number;
  readonly power_day_kw: number;
  readonly power_night_kw: number;
  readonly note: string;
}

/** What a list is made from. */
export interface ListPlan {
  readonly seed: number;
  readonly rows: number;
  readonly raster: readonly RasterRange[];
  /** Channels that nobody is given, hertz. */
  readonly unusedHz?: readonly number[];
  readonly callPrefix: string;
  /** Where the invented country lies, degrees. */
  readonly area: {
    readonly south: number;
    readonly north: number;
    readonly west: number;
    readonly east: number;
  };
}

interface Town {
  readonly name: string;
  readonly latitude: number;
  readonly longitude: number;
  /** Channel of its first station, as an index; the others follow at a distance. */
  readonly firstChannel: number;
  stations: number;
}

export const COLUMNS = [
  'name',
  'call_sign',
  'frequency_khz',
  'latitude',
  'longitude',
  'power_day_kw',
  'power_night_kw',
  'note',
] as const satisfies readonly (keyof ListRow)[];

const STATIONS_PER_TOWN = 7;
const MAX_TOWNS = 5000;
const CITY_BIAS = 1.4;
/** Stations of one town lie at least this many channels apart, until its channels run out. */
const CHANNEL_STRIDE = 11;

const POWERS_KW = [0.25, 0.5, 1, 1, 1, 2.5, 5, 5, 10, 10, 20, 50, 100] as const;
const LONG_WAVE_POWERS_KW = [50, 100, 150, 300, 500] as const;
const NIGHT_SHARES = [1, 1, 1, 1, 0.5, 0.25, 0.1, 0.1, 0, 0] as const;
const LONG_WAVE_BELOW_HZ = 300_000;

/**
 * Stations of an invented country: towns of very different size, each with stations some channels
 * apart, powers by day and night as such lists have them, many weaker or silent at night.
 * Rows are made one after another, so that a list of a million needs no room.
 */
export function* listRows(plan: ListPlan): Generator<ListRow> {
  const random = seededRandom(plan.seed);
  const channels = rasterChannels(plan.raster, 0, Infinity).filter(
    (channel) => !plan.unusedHz?.includes(channel),
  );
  const towns = foundTowns(plan, random, channels.length);
  for (let ordinal = 0; ordinal < plan.rows; ordinal++) {
    // A power of the random number favours the first towns: they are the cities.
    const town = towns[Math.floor(random() ** CITY_BIAS * towns.length)];
    if (!town) return;
    const channel = channels[channelIndex(town, channels.length)] ?? 0;
    const name = stationName(town.name, town.stations++);
    const powers = stationPowers(random, channel);
    yield {
      name,
      call_sign: callSign(plan.callPrefix, ordinal),
      frequency_khz: channel / 1000,
      latitude: degrees(town.latitude + 0.3 * (random() - 0.5)),
      longitude: degrees(town.longitude + 0.4 * (random() - 0.5)),
      ...powers,
      note: remark(random, powers, town.name),
    };
  }
}

function foundTowns({ rows, area }: ListPlan, random: () => number, channels: number): Town[] {
  const count = Math.min(MAX_TOWNS, Math.ceil(rows / STATIONS_PER_TOWN));
  const names = new Set<string>();
  return Array.from({ length: count }, () => {
    let name = inventedPlace(random);
    while (names.has(name)) name = `${pick(random, ['New', 'Old', 'Upper', 'Lower'])} ${name}`;
    names.add(name);
    return {
      name,
      latitude: area.south + (area.north - area.south) * random(),
      longitude: area.west + (area.east - area.west) * random(),
      firstChannel: Math.floor(random() * channels),
      stations: 0,
    };
  });
}

/** A stride without a divisor in common with the number of channels visits every one of them. */
function channelIndex(town: Town, channels: number): number {
  let stride = Math.min(CHANNEL_STRIDE, channels);
  while (greatestDivisor(stride, channels) !== 1) stride++;
  return (town.firstChannel + town.stations * stride) % channels;
}

const greatestDivisor = (a: number, b: number): number => (b === 0 ? a : greatestDivisor(b, a % b));

function stationPowers(
  random: () => number,
  channelHz: number,
): Pick<ListRow, 'power_day_kw' | 'power_night_kw'> {
  const day = pick(random, channelHz < LONG_WAVE_BELOW_HZ ? LONG_WAVE_POWERS_KW : POWERS_KW);
  return {
    power_day_kw: day,
    power_night_kw: Number((day * pick(random, NIGHT_SHARES)).toFixed(3)),
  };
}

function remark(
  random: () => number,
  { power_day_kw: day, power_night_kw: night }: Pick<ListRow, 'power_day_kw' | 'power_night_kw'>,
  place: string,
): string {
  if (night === 0) return 'daytime only';
  if (night < day) return pick(random, ['reduced at night', 'directional at night, two masts', '']);
  return pick(random, ['', '', '', 'one mast', `relays ${place}, mornings and evenings`]);
}

const degrees = (value: number): number => Number(value.toFixed(4));
