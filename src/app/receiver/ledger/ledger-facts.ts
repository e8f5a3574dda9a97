import type { FieldStrengthsAnswer } from '../../../../shared/contracts/field-strengths';
import { pathBearing, type Place } from '../../../../shared/radio/propagation/path';
import type { Service } from '../../../../shared/radio/receiver';
import { gradeWord } from '../../charts/band-strip/grade-word';
import type { JudgedResponse } from '../../charts/band-strip/strip-layout';
import { distance, field } from '../../charts/readings';
import { formatFrequency } from '../../ui/frequency-pipe';
import { gradeBasis } from './grade-basis';

/** What a response stands among. */
export interface LedgerContext {
  readonly response: JudgedResponse;
  readonly band: string;
  readonly service: Service;
  readonly nameOf: (station: number) => string;
  /** The station at the site; undefined: its field is not known. */
  readonly station: FieldStrengthsAnswer['fields'][number] | undefined;
  /** Place of the aerial; null: not given. */
  readonly place: Place | null;
}

export interface LedgerFact {
  readonly label: string;
  readonly value: string;
}

/** What the response is, in one line. */
export function ledgerTitle({ response, nameOf, band }: LedgerContext): string {
  const { name, station, dialHz } = response;
  const where = dialHz === null ? $localize`everywhere` : formatFrequency(dialHz);
  return $localize`${nameOf(station)}:station: at ${where}:dial:, ${band}:band:: ${name}:product:`;
}

/** What is known beside the terms: station, path, beat, what is wanted, grade and its basis. */
export function ledgerFacts(context: LedgerContext): LedgerFact[] {
  const { response, nameOf, station, service } = context;
  const { wantedStation, secondStation } = response;
  const wanted = wantedStation === null ? $localize`an assumed field` : nameOf(wantedStation);
  return [
    {
      label: $localize`Station`,
      value: [nameOf(response.station), station && formatFrequency(station.frequencyHz)]
        .filter((each) => each !== undefined)
        .join(', '),
    },
    ...(secondStation === undefined
      ? []
      : [{ label: $localize`With`, value: nameOf(secondStation) }]),
    { label: $localize`Path`, value: pathWords(context) },
    ...(station ? [{ label: $localize`Waves`, value: waveWords(station) }] : []),
    { label: $localize`Beat`, value: formatFrequency(response.beatHz) },
    { label: $localize`Wanted`, value: wanted },
    {
      label: $localize`Grade`,
      value: `${gradeWord(response)}: ${gradeBasis(response.grade, service)}`,
    },
  ];
}

function pathWords({ response, station, place }: LedgerContext): string {
  if (response.distanceM === null) return $localize`not known: the field is as given`;
  const far = distance(response.distanceM);
  const [latitude, longitude] = [station?.latitude ?? null, station?.longitude ?? null];
  if (place === null || latitude === null || longitude === null) return far;
  const bearing = (pathBearing(place, { latitude, longitude }) + 360) % 360;
  return $localize`${far}:distance:, bearing ${Math.round(bearing) % 360}:bearing:° from the aerial`;
}

function waveWords(station: NonNullable<LedgerContext['station']>): string {
  if (station.groundDb === null) return station.notes.join(' ') || $localize`as given`;
  const ground = $localize`ground ${field(station.groundDb)}:ground:`;
  const sky =
    station.skyDb === null
      ? $localize`no sky wave`
      : $localize`sky ${field(station.skyDb)}:sky: on half of the nights`;
  return [`${ground}; ${sky}.`, ...station.notes].join(' ');
}

/** The working as plain text, to be pasted. */
export function ledgerText(
  context: LedgerContext,
  lines: readonly { label: string; value: string; formula: string }[],
  address: string,
): string {
  return [
    ledgerTitle(context),
    ...ledgerFacts(context).map(({ label, value }) => `${label}: ${value}`),
    '',
    ...lines.map(({ label, value, formula }) => [label, value, formula].join('\t')),
    '',
    address,
  ].join('\n');
}
