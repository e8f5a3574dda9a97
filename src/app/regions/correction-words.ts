import { formatDate } from '@angular/common';

import type { CorrectionKind, CorrectionMark } from '../../../shared/contracts/correction';
import type { StationRecord } from '../../../shared/contracts/station-list';
import { formatFrequency } from '../ui/frequency-pipe';
import type { IconName } from '../ui/icon/icon-paths';
import { formatPlace } from '../ui/place/place';
import { formatPower } from './power-pipe';

export const correctionIcons: Readonly<Record<CorrectionKind, IconName>> = {
  added: 'add',
  changed: 'edit',
  'off-air': 'close',
  heard: 'check',
};

/** What was done, in a word or three. */
export function correctionKindWords(kind: CorrectionKind): string {
  switch (kind) {
    case 'added':
      return $localize`added by hand`;
    case 'changed':
      return $localize`changed by hand`;
    case 'off-air':
      return $localize`off the air`;
    case 'heard':
      return $localize`heard`;
  }
}

/** "off the air: Ada Quill, 1 December 2026". */
export function correctionWords(
  { kind, date, authorName }: Pick<CorrectionMark, 'kind' | 'date' | 'authorName'>,
  locale: string,
): string {
  const day = formatDate(date, 'mediumDate', locale);
  const what = correctionKindWords(kind);
  return authorName === ''
    ? $localize`${what}:what:, ${day}:day:`
    : $localize`${what}:what:: ${authorName}:name:, ${day}:day:`;
}

/** The latest correction of each kind; of heard and off the air, the later. */
export function latestOfEach(corrections: readonly CorrectionMark[]): CorrectionMark[] {
  const latest = new Map<string, CorrectionMark>();
  for (const mark of corrections) {
    latest.set(mark.kind === 'heard' ? 'off-air' : mark.kind, mark);
  }
  return [...latest.values()];
}

type Written = { readonly [K in keyof Omit<StationRecord, 'id'>]?: StationRecord[K] | undefined };

/** What a list says of a station, by name and in words. */
export type StationFact =
  'name' | 'callSign' | 'frequency' | 'place' | 'day' | 'night' | 'hours' | 'note';

export const STATION_FACTS = [
  'name',
  'callSign',
  'frequency',
  'place',
  'day',
  'night',
  'hours',
  'note',
] as const satisfies readonly StationFact[];

/** One of a station's facts as people read it; undefined where nothing is said of it. */
export function writtenFact(station: Written, fact: StationFact): string | undefined {
  switch (fact) {
    case 'frequency':
      return station.frequencyHz === undefined ? undefined : formatFrequency(station.frequencyHz);
    case 'place':
      return station.latitude === undefined || station.longitude === undefined
        ? undefined
        : formatPlace(station.latitude, station.longitude);
    case 'day':
      return station.powerDayW === undefined ? undefined : formatPower(station.powerDayW);
    case 'night':
      return station.powerNightW === undefined ? undefined : formatPower(station.powerNightW);
    default:
      return station[fact] === undefined ? undefined : station[fact] || '–';
  }
}

export function factName(fact: StationFact): string {
  switch (fact) {
    case 'name':
      return $localize`Name`;
    case 'callSign':
      return $localize`Call sign`;
    case 'frequency':
      return $localize`Frequency`;
    case 'place':
      return $localize`Place`;
    case 'day':
      return $localize`Power by day`;
    case 'night':
      return $localize`Power by night`;
    case 'hours':
      return $localize`Times of service`;
    case 'note':
      return $localize`Remark`;
  }
}
