import { describe, expect, it } from 'vitest';

import { changesOf, type Differing, movedBy, powerChange, stationPairs } from './station-pairs.ts';

let lastId = 0;
function station(name: string, given: Partial<Differing> = {}): Differing {
  const frequencyHz = given.frequencyHz ?? 612_000;
  return {
    id: ++lastId,
    name,
    callSign: '',
    frequencyHz,
    latitude: 50,
    longitude: 10,
    powerDayW: 1000,
    powerNightW: 1000,
    hours: '',
    note: '',
    patternDb: null,
    identity: `${name} ${frequencyHz}`,
    ...given,
  };
}

const namesOf = (before: Differing[], after: Differing[]) =>
  [...stationPairs(before, after)].map((pair) => [pair.before?.id ?? null, pair.after?.id ?? null]);

describe('stationPairs', () => {
  it('pairs stations of one identity, and tells what is gone and what was added', () => {
    const [old, kept] = [station('Old'), station('Kept')];
    const [strong, fresh] = [station('Kept', { powerDayW: 5000 }), station('Fresh')];

    const pairs = namesOf([old, kept], [fresh, strong]);

    expect(pairs).toEqual([
      [kept.id, strong.id],
      [old.id, null],
      [null, fresh.id],
    ]);
  });

  it('pairs transmitters in step with the nearest each, whatever their order', () => {
    const north = station('Step', { latitude: 55 });
    const south = station('Step', { latitude: 45 });
    const nearSouth = station('Step', { latitude: 45.1 });
    const nearNorth = station('Step', { latitude: 54.9 });

    expect(namesOf([north, south], [nearSouth, nearNorth])).toEqual(
      expect.arrayContaining([
        [north.id, nearNorth.id],
        [south.id, nearSouth.id],
      ]),
    );
  });

  it('takes one name on another frequency at the same place for a change of frequency', () => {
    const before = station('Radio Vale');
    const after = station('radio vale', { frequencyHz: 621_000 });

    expect(namesOf([before], [after])).toEqual([[before.id, after.id]]);
    expect(changesOf({ before, after })).toEqual(['changed-frequency', 'changed-other']);
  });

  it('takes one name on another frequency far away for another station', () => {
    const before = station('Radio Vale');
    const after = station('Radio Vale', { frequencyHz: 621_000, latitude: 51 });

    expect(namesOf([before], [after])).toEqual([
      [before.id, null],
      [null, after.id],
    ]);
  });

  it('pairs each station once, also where far too many share an identity', () => {
    const many = () => Array.from({ length: 101 }, () => station('Crowd'));

    const pairs = namesOf(many(), many());

    expect(pairs).toHaveLength(101);
    expect(new Set(pairs.flat()).size).toBe(202);
  });
});

describe('changesOf', () => {
  it.each([
    [{ latitude: 51 }, ['moved']],
    [{ powerNightW: null }, ['changed-power']],
    [{ note: 'new mast' }, ['changed-other']],
    [{ patternDb: Array<number>(36).fill(0) }, ['changed-other']],
    [{ longitude: 9, powerDayW: 1 }, ['moved', 'changed-power']],
  ] as const)('names %j as %j', (given, kinds) => {
    const before = station('Vale');
    const after = { ...before, ...given, patternDb: 'patternDb' in given ? given.patternDb : null };
    expect(changesOf({ before, after })).toEqual(kinds);
  });

  it('names what stands in one edition only', () => {
    const one = station('Vale');
    expect(changesOf({ before: null, after: one })).toEqual(['added']);
    expect(changesOf({ before: one, after: null })).toEqual(['gone']);
  });
});

describe('movedBy', () => {
  it('is the length of the path: a degree of a meridian is some 111 km', () => {
    const before = station('Vale');
    expect(movedBy({ before, after: { ...before, latitude: 51 } })).toBeGreaterThan(111_000);
    expect(movedBy({ before, after: { ...before, latitude: 51 } })).toBeLessThan(111_500);
  });

  it('is not known without a place', () => {
    const before = station('Vale');
    expect(movedBy({ before, after: { ...before, latitude: null, longitude: null } })).toBeNull();
  });
});

describe('powerChange', () => {
  it('is ten decibels for ten times the power, and not known of a silent station', () => {
    expect(powerChange(100, 1000)).toBeCloseTo(10, 12);
    expect(powerChange(0, 1000)).toBeNull();
    expect(powerChange(undefined, 1000)).toBeNull();
  });
});
