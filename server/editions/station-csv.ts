import type { StationRecord } from '../../shared/contracts/station-list.ts';
import type { Actor } from '../http/actor.ts';
import { isAdded } from './corrected-list.ts';
import type { EditionStations } from './edition-stations.ts';

const BEARINGS = Array.from({ length: 36 }, (_, index) => 10 * index);
const PLAIN_HEADERS = [
  'name',
  'call_sign',
  'frequency_hz',
  'latitude',
  'longitude',
  'power_day_w',
  'power_night_w',
  'hours',
  'note',
];
const PATTERN_HEADERS = BEARINGS.map((bearing) => `pattern_${String(bearing).padStart(3, '0')}_db`);

type Row = readonly (string | number | null)[];

/**
 * The stations of an edition as rows that an import takes for the same: hertz, watts and degrees,
 * not rounded. As corrected by hand, those off the air are left out.
 */
export async function stationRows(
  stations: EditionStations,
  actor: Actor,
  editionId: number,
  corrections: 'applied' | 'none',
) {
  const { edition, corrected } = await stations.open(actor, editionId, corrections);
  const hasPatterns = await stations.hasPatterns(editionId);
  async function* rows(): AsyncGenerator<Row> {
    yield hasPatterns ? [...PLAIN_HEADERS, ...PATTERN_HEADERS] : PLAIN_HEADERS;
    for await (const batch of stations.batches(editionId)) {
      for (const record of batch) {
        const instead = corrected?.stations.get(record.id);
        if (!instead?.offAir) yield toRow(instead?.record ?? record, hasPatterns);
      }
    }
    for (const [id, { record, offAir }] of corrected?.stations ?? []) {
      if (isAdded(id) && !offAir) yield toRow(record, hasPatterns);
    }
  }
  return { edition, rows: rows() };
}

/** A text that looks defused already gets another apostrophe: an import takes one off. */
const asText = (text: string): string => (/^'+[=+\-@]/.test(text) ? `'${text}` : text);

function toRow(record: StationRecord, hasPatterns: boolean): Row {
  const plain = [
    asText(record.name),
    asText(record.callSign),
    record.frequencyHz,
    record.latitude,
    record.longitude,
    record.powerDayW,
    record.powerNightW,
    asText(record.hours),
    asText(record.note),
  ];
  if (!hasPatterns) return plain;
  return [...plain, ...BEARINGS.map((_, index) => record.patternDb?.[index] ?? null)];
}
