import type { StationPlace, StationPlaces } from '../../../../../shared/contracts/station-list';
import type { Period } from '../../../../../shared/radio/site';
import { distance, field, kilohertz, kilometres, tenths, whole } from '../../../charts/readings';
import type { Readout } from '../../../charts/plot/plot-mark';
import type { MapStation, SizeScale, StationLook } from '../../../charts/station-map/map-station';
import type { ChartTable } from '../../../charts/twin-table/twin-table';
import { formatFrequency } from '../../../ui/frequency-pipe';
import { formatPlace } from '../../../ui/place/place';
import { formatPower } from '../../power-pipe';

const AT_SITE: SizeScale = {
  title: $localize`Field at the site`,
  lowDb: 10,
  highDb: 110,
  samples: [30, 60, 90].map((level) => ({ level, text: field(level) })),
};
const BY_POWER: SizeScale = {
  title: $localize`Power`,
  lowDb: 20,
  highDb: 60,
  samples: [1_000, 10_000, 100_000].map((watts) => ({
    level: 10 * Math.log10(watts),
    text: formatPower(watts),
  })),
};

/** By the field at the site, where one is chosen, else by power. */
export const sizesFor = (isAtSite: boolean): SizeScale => (isAtSite ? AT_SITE : BY_POWER);

export const mapStations = (places: readonly StationPlace[], isAtSite: boolean): MapStation[] =>
  places.map((place) => ({
    id: `${place.id}`,
    name: place.name,
    latitude: place.latitude,
    longitude: place.longitude,
    level: isAtSite ? place.fieldDb : powerDb(place),
    look: lookOf(place),
  }));

function powerDb({ powerDayW, powerNightW }: StationPlace): number | null {
  const watts = Math.max(powerDayW ?? 0, powerNightW ?? 0);
  return watts > 0 ? 10 * Math.log10(watts) : null;
}

function lookOf({ offAir, onRaster }: StationPlace): StationLook {
  if (offAir) return 'off-air';
  return onRaster ? 'plain' : 'off-raster';
}

export function placeReadout(place: StationPlace): Readout {
  const { name, frequencyHz, latitude, longitude, powerDayW, powerNightW } = place;
  const remark = [
    ...(place.onRaster ? [] : [$localize`off the raster`]),
    ...(place.offAir ? [$localize`off the air`] : []),
  ].join(', ');
  return {
    title: `${name || '–'} ${formatFrequency(frequencyHz)}`,
    lines: [
      ...(place.distanceM === null
        ? []
        : [
            { label: $localize`Distance`, value: distance(place.distanceM) },
            { label: $localize`Field`, value: field(place.fieldDb) },
          ]),
      { label: $localize`Power by day`, value: formatPower(powerDayW) },
      { label: $localize`by night`, value: formatPower(powerNightW) },
      { label: $localize`Place`, value: formatPlace(latitude, longitude) },
      ...(remark === '' ? [] : [{ label: $localize`Remark`, value: remark }]),
    ],
  };
}

/** The same stations as rows, in the order in which keys go through them. */
export const mapTable = (places: readonly StationPlace[]): ChartTable => ({
  columns: [
    $localize`Station`,
    $localize`kHz`,
    $localize`Latitude`,
    $localize`Longitude`,
    $localize`Power by day, W`,
    $localize`Power by night, W`,
    $localize`Distance, km`,
    $localize`Field, dB(µV/m)`,
    $localize`On the raster`,
    $localize`On the air`,
  ],
  rows: places.map((place) => ({ id: `${place.id}`, cells: cellsOf(place) })),
});

const NOTHING = '\u2013';

const cellsOf = (place: StationPlace): string[] => [
  place.name || NOTHING,
  kilohertz(place.frequencyHz),
  signed(place.latitude),
  signed(place.longitude),
  place.powerDayW === null ? NOTHING : `${place.powerDayW}`,
  place.powerNightW === null ? NOTHING : `${place.powerNightW}`,
  kilometres(place.distanceM),
  place.fieldDb === null ? NOTHING : tenths(place.fieldDb),
  place.onRaster ? $localize`yes` : $localize`no`,
  place.offAir ? $localize`no` : $localize`yes`,
];

const signed = (degrees: number): string => `${degrees}`.replace('-', '\u2212');

/** What the map shows, in a sentence with its own numbers. */
export function mapSentence(
  { items, total, withoutPlace }: StationPlaces,
  site: string | null,
  period: Period,
): string {
  return [
    counted(items, site, period),
    withoutPlace > 0 ? $localize`${withoutPlace}:count: more have no place.` : '',
    items.length + withoutPlace < total
      ? $localize`Only the strongest ${items.length}:shown: of ${total}:total: are shown; filter to see others.`
      : '',
  ]
    .filter((part) => part !== '')
    .join(' ');
}

function counted(items: readonly StationPlace[], site: string | null, period: Period): string {
  const [first] = items;
  if (!first) return $localize`No station with a place is among them.`;
  const name = `${first.name || NOTHING} (${formatFrequency(first.frequencyHz)})`;
  if (site === null || first.fieldDb === null) {
    return $localize`${items.length}:count: stations; most power: ${name}:station:.`;
  }
  const when = period === 'day' ? $localize`by day` : $localize`by night`;
  return $localize`${items.length}:count: stations; strongest at ${site}:site: ${when}:period: is ${name}:station: with ${whole(first.fieldDb)}:field: dB(µV/m) from ${distance(first.distanceM)}:distance:.`;
}
