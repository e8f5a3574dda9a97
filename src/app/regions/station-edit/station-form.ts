import { FormControl, FormGroup, type ValidatorFn } from '@angular/forms';
import * as z from 'zod';

import {
  addedStation,
  type AddedStation,
  type ChangedFields,
} from '../../../../shared/contracts/correction';
import { noteText } from '../../../../shared/contracts/quantities';
import type { StationRecord } from '../../../../shared/contracts/station-list';
import { needed } from '../../ui/form-problems/form-issues';
import { type Axis, formatCoordinate, parseCoordinate } from '../../ui/place/coordinate';

const text = (...validators: ValidatorFn[]) =>
  new FormControl('', { nonNullable: true, validators });

const coordinate =
  (axis: Axis): ValidatorFn =>
  ({ value }: { value: string }) => {
    const reading = parseCoordinate(value, axis);
    return 'problem' in reading ? { problem: reading.problem } : null;
  };

/** Controls of a station; coordinates are held as typed. Paths are those of `stationToSave`. */
export const stationForm = () =>
  new FormGroup({
    station: new FormGroup({
      name: text(),
      callSign: text(),
      frequencyHz: new FormControl<number | null>(
        null,
        needed($localize`Give a frequency, such as 612 kHz.`),
      ),
      latitude: text(coordinate('latitude')),
      longitude: text(coordinate('longitude')),
      powerDayW: new FormControl<number | null>(null),
      powerNightW: new FormControl<number | null>(null),
      hours: text(),
      note: text(),
    }),
    reason: text(),
  });

export type StationForm = ReturnType<typeof stationForm>;

/** What can be typed into the form, valid or not. */
export const stationTyped = z.object({
  station: z.object({
    name: z.string(),
    callSign: z.string(),
    frequencyHz: z.number().nullable(),
    latitude: z.string(),
    longitude: z.string(),
    powerDayW: z.number().nullable(),
    powerNightW: z.number().nullable(),
    hours: z.string(),
    note: z.string(),
  }),
  reason: z.string(),
});

/** What is sent: the station, and why it is added or changed. */
export const stationToSave = z.object({ station: addedStation, reason: noteText });

/** What the form says, to be checked by the contract. */
export function typedStation(form: StationForm): unknown {
  const { station, reason } = form.getRawValue();
  return {
    station: {
      ...station,
      latitude: degrees(station.latitude, 'latitude'),
      longitude: degrees(station.longitude, 'longitude'),
    },
    reason,
  };
}

export function showStation(form: StationForm, station: StationRecord): void {
  const { id: _id, patternDb: _pattern, ...shown } = stationOnly(station);
  form.reset({
    station: {
      ...shown,
      latitude: written(station.latitude, 'latitude'),
      longitude: written(station.longitude, 'longitude'),
    },
    reason: '',
  });
}

/** What is another than before; latitude and longitude go together. */
export function changesOf(before: StationRecord, after: AddedStation): ChangedFields {
  const names = Object.keys(after) as (keyof AddedStation)[];
  const isMoved = before.latitude !== after.latitude || before.longitude !== after.longitude;
  const isPlace = (name: string) => name === 'latitude' || name === 'longitude';
  const changed = names.filter((name) => (isPlace(name) ? isMoved : before[name] !== after[name]));
  return Object.fromEntries(changed.map((name) => [name, after[name]]));
}

const stationOnly = ({
  id,
  name,
  callSign,
  frequencyHz,
  latitude,
  longitude,
  powerDayW,
  powerNightW,
  hours,
  note,
  patternDb,
}: StationRecord): StationRecord => ({
  ...{ id, name, callSign, frequencyHz, latitude, longitude },
  ...{ powerDayW, powerNightW, hours, note, patternDb },
});

function degrees(typed: string, axis: Axis): number | null {
  const reading = parseCoordinate(typed, axis);
  return 'problem' in reading ? null : reading.value;
}

/** In full: a place must not move because a form was opened. */
const written = (value: number | null, axis: Axis): string =>
  value === null
    ? ''
    : Math.abs(value - Number(value.toFixed(4))) < 1e-9
      ? formatCoordinate(value, axis)
      : `${value}`;
