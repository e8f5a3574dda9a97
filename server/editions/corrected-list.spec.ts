import { describe, expect, it } from 'vitest';

import type { StationRecord } from '../../shared/contracts/station-list.ts';
import {
  addedIdentity,
  addedStationId,
  type AppliedCorrection,
  correctedList,
  isAdded,
} from './corrected-list.ts';

const record: StationRecord = {
  id: 7,
  name: 'Radio Vale',
  callSign: '',
  frequencyHz: 612_000,
  latitude: 50,
  longitude: 10,
  powerDayW: 1000,
  powerNightW: 500,
  hours: '',
  note: '',
  patternDb: null,
};
const listed = [{ identity: 'vale', record }];

const correction = (id: number, given: Partial<AppliedCorrection>): AppliedCorrection => ({
  id,
  kind: 'changed',
  identity: 'vale',
  station: record,
  fields: null,
  note: '',
  date: '2026-01-01',
  authorId: 1,
  updatedAt: new Date(0),
  ...given,
});

describe('correctedList', () => {
  it('leaves an edition alone that nobody corrected', () => {
    const list = correctedList([], listed);
    expect(list.stations.size).toBe(0);
    expect([list.version, list.state]).toEqual(['', '']);
  });

  it('lets the latest word count, by its date, not by when it was written', () => {
    const late = correction(1, { date: '2026-03-01', fields: { powerDayW: 3000 } });
    const early = correction(2, { date: '2026-02-01', fields: { powerDayW: 2000, note: 'heard' } });

    const station = correctedList([late, early], listed).stations.get(7);

    expect(station?.record).toMatchObject({ powerDayW: 3000, note: 'heard', powerNightW: 500 });
    expect(station?.corrections.map(({ id }) => id)).toEqual([2, 1]);
    expect(record.powerDayW).toBe(1000);
  });

  it('takes a station off the air until it is heard again', () => {
    const off = correction(1, { kind: 'off-air' });
    const heard = correction(2, { kind: 'heard', date: '2026-01-02' });

    expect(correctedList([off], listed).stations.get(7)?.offAir).toBe(true);
    expect(correctedList([off, heard], listed).stations.get(7)?.offAir).toBe(false);
  });

  it('changes the version by what computing sees, and the state by what lists show', () => {
    const off = correctedList([correction(1, { kind: 'off-air' })], listed);
    const heard = correctedList([correction(1, { kind: 'heard' })], listed);
    const again = correctedList([correction(1, { kind: 'off-air', note: 'silent' })], listed);

    expect(heard.version).toBe('');
    expect(heard.state).not.toBe('');
    expect(off.version).not.toBe('');
    expect(again.version).toBe(off.version);
  });

  it('adds a station and corrects it in its turn, ids apart from imported ones', () => {
    const added = correction(5, { kind: 'added', identity: 'beacon' });
    const tick = correction(6, { kind: 'off-air', identity: addedIdentity(5) });

    const { stations, stationOf } = correctedList([tick, added], listed);

    const id = addedStationId(5);
    expect(isAdded(id)).toBe(true);
    expect(stations.get(id)).toMatchObject({ offAir: true, record: { id, name: 'Radio Vale' } });
    expect(stationOf).toEqual(
      new Map([
        [5, id],
        [6, id],
      ]),
    );
  });

  it('lets an added station, and ticks of it, give way to the official one', () => {
    const added = correction(5, { kind: 'added' });
    const tick = correction(6, { kind: 'off-air', identity: addedIdentity(5) });

    const { stations, stationOf } = correctedList([added, tick], listed);

    expect([...stations.keys()]).toEqual([7]);
    expect(stations.get(7)?.offAir).toBe(true);
    expect(stationOf.get(5)).toBe(7);
  });

  it('means the nearest of several stations of one identity, over the date line too', () => {
    const east = { ...record, id: 8, longitude: 179.9 };
    const west = { ...record, id: 9, longitude: 150 };
    const step = [west, east].map((each) => ({ identity: 'vale', record: each }));
    const off = correction(1, { kind: 'off-air', station: { ...record, longitude: -179.9 } });

    expect([...correctedList([off], step).stations.keys()]).toEqual([8]);
  });

  it('keeps a correction without a station where the edition has none', () => {
    const { stations, stationOf } = correctedList([correction(1, { identity: 'gone' })], listed);
    expect([stations.size, stationOf.size]).toEqual([0, 0]);
  });
});
