import { hash } from 'node:crypto';

import type { StationRow } from './station-row.ts';

/** Short, collision-free for any list: 132 bits of SHA-256 in 22 characters. */
const digest = (parts: readonly (string | number | null)[]): string =>
  hash('sha256', parts.join('\u001f'), 'base64url').slice(0, 22);

/** By what a station is recognised in the next edition: call sign, else name, and frequency. */
export const identityOf = ({ callSign, name, frequencyHz }: StationRow): string =>
  digest([(callSign || name).toLowerCase(), frequencyHz]);

/** Equal for two rows exactly when everything they say is equal. */
export const fingerprintOf = (row: StationRow): string =>
  digest([
    row.name,
    row.callSign,
    row.frequencyHz,
    row.latitude,
    row.longitude,
    row.powerDayW,
    row.powerNightW,
    row.hours,
    row.note,
  ]);
