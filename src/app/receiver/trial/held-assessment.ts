import { type Assessment, assess } from '../../../../shared/radio/assessment/assessment';
import { CANDIDATE_ORDERS } from '../../../../shared/radio/candidates/candidates';
import type { Station } from '../../../../shared/radio/station';
import type { HeldList, TrialQuestion } from './trial-messages';

/** A field without a ground wave of its own was given with the station, not computed. */
const isGiven = ({ groundDb }: HeldList['fields'][number]): boolean => groundDb === null;

/** The list as the engine takes it: fields are known, so places and powers are not needed. */
export function heldStations({ fields }: HeldList): Station[] {
  return fields.map((field) => ({
    id: field.station,
    name: field.name,
    frequencyHz: field.frequencyHz,
    latitude: null,
    longitude: null,
    powerDayW: null,
    powerNightW: null,
    fieldDb: isGiven(field) ? field.fieldDb : null,
  }));
}

/** Judges a receiver against a list held on the client, as the server does. */
export const assessHeld = (
  list: HeldList,
  stations: readonly Station[],
  question: TrialQuestion,
): Assessment =>
  assess({ ...list, stations, ...question, ...CANDIDATE_ORDERS, leaveOutBetterThan: null });
