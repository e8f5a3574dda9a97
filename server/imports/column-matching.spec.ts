import { describe, expect, it } from 'vitest';

import { isComplete, proposeColumns } from './column-matching.ts';

const propose = (header: string, ...rows: string[]) =>
  proposeColumns(
    header.split(';'),
    rows.map((row) => row.split(';')),
    '.',
  );

describe('proposeColumns', () => {
  it('takes the first of two columns for one field', () => {
    const fields = propose('name;station;kHz').map(({ field }) => field);

    expect(fields).toEqual(['name', null, 'frequency']);
  });

  it('takes a unit from the cells when all carry the same', () => {
    expect(propose('name;frequency', 'a;612 kHz', 'b;621 khz')[1]?.unit).toBe('kHz');
    expect(propose('name;frequency', 'a;612 kHz', 'b;621')[1]?.unit).toBeNull();
    expect(propose('name;power', 'a;5 kW', 'b;')[1]?.unit).toBe('kW');
  });

  it('tells packed degrees, minutes and seconds from decimal degrees', () => {
    expect(propose('name;latitude', 'a;483036', 'b;491500N')[1]?.unit).toBe('dms');
    expect(propose('name;latitude', 'a;48.51', 'b;-49')[1]?.unit).toBe('degrees');
    expect(propose('name;latitude', 'a;48\u00b030\u203236\u2033N')[1]?.unit).toBe('degrees');
  });

  it('ignores a unit that the field cannot have', () => {
    expect(propose('name;Frequency (kW)', 'a;612')[1]).toEqual({
      header: 'Frequency (kW)',
      field: 'frequency',
      unit: null,
    });
  });
});

describe('isComplete', () => {
  it.each([
    ['name;frequency_khz', true],
    ['call sign;kHz', true],
    ['frequency_khz', false],
    ['name;frequency', false],
    ['name;frequency_khz;latitude', false],
    ['name;frequency_khz;latitude;longitude', true],
    ['name;frequency_khz;power', false],
  ])('of %s is %s', (header, complete) => {
    expect(isComplete({ columns: propose(header, 'a;1;1;1'), letterO: null })).toBe(complete);
  });
});
