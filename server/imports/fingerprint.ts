import { hash } from 'node:crypto';

import type { StationRow } from './station-row.ts';

/** Short, collision-free for any list: 132 bits of SHA-256 in 22 characters. */
export const digest = (text: string): string => hash('sha256', text, 'base64url').slice(0, 22);

const SEPARATOR = '\u001f';
const known = (value: number | null): string => (value === null ? '' : String(value));

/** By what a station is recognised in the next edition: call sign, else name, and frequency. */
export const identityOf = ({
  callSign,
  name,
  frequencyHz,
}: Pick<StationRow, 'callSign' | 'name' | 'frequencyHz'>): string =>
  digest((callSign || name).toLowerCase() + SEPARATOR + String(frequencyHz));

/** Equal for two rows exactly when everything they say is equal. */
export const fingerprintOf = (row: StationRow): string => {
  const text = [
    row.name,
    row.callSign,
    String(row.frequencyHz),
    known(row.latitude),
    known(row.longitude),
    known(row.powerDayW),
    known(row.powerNightW),
    row.hours,
    row.note,
  ].join(SEPARATOR);
  return digest(row.patternDb === null ? text : text + SEPARATOR + row.patternDb.join(','));
};
