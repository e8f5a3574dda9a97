import { convertToParamMap } from '@angular/router';

import { addressParams, readAddress, type TrialAddress } from './trial-address';

describe('the address of a trial', () => {
  it('says site, edition, period and IF', () => {
    const params = convertToParamMap({
      site: '3',
      edition: '7',
      period: 'day',
      at: '2026-12-21T12:30:00Z',
      also: '4.e8_5.a70',
      if: '554000',
      mark: 'station-3',
      set: '{}',
    });

    expect(readAddress(params)).toEqual({
      setUp: '{}',
      siteId: 3,
      source: { kind: 'edition', editionId: 7 },
      period: 'day',
      at: '2026-12-21T12:30:00Z',
      others: [
        { siteId: 4, source: { kind: 'edition', editionId: 8 } },
        { siteId: 5, source: { kind: 'every-channel', fieldDb: 70 } },
      ],
      ifHz: 554_000,
      picked: 'station-3',
    });
  });

  it('reads nonsense as not said', () => {
    const params = convertToParamMap({
      site: '-3',
      every: 'loud',
      period: 'dusk',
      if: '1e3',
      at: 'noon',
      also: '4_e7.x',
    });

    expect(readAddress(params)).toEqual({
      setUp: undefined,
      siteId: undefined,
      source: undefined,
      period: 'night',
      at: undefined,
      others: [],
      ifHz: undefined,
      picked: undefined,
    });
  });

  it.each<TrialAddress>([
    {
      setUp: '{"strayDb.if":80}',
      siteId: 3,
      source: { kind: 'edition', editionId: 7 },
      period: 'day',
      at: '2026-12-21T12:30:00Z',
      others: [{ siteId: 9, source: { kind: 'every-channel', fieldDb: -3.5 } }],
      ifHz: 554_000,
      picked: 'response|3||1|1|612000|Range 4',
    },
    {
      setUp: undefined,
      siteId: 4,
      source: { kind: 'every-channel', fieldDb: 72.5 },
      period: 'night',
      at: undefined,
      others: [],
      ifHz: undefined,
      picked: undefined,
    },
  ])('reads back what it writes', (address) => {
    const said = Object.entries(addressParams(address)).flatMap(([key, value]) =>
      value === null ? [] : [[key, String(value)]],
    );

    expect(readAddress(convertToParamMap(Object.fromEntries(said)))).toEqual(address);
  });

  it('takes the other source out when one is named', () => {
    expect(addressParams({ source: { kind: 'edition', editionId: 7 } })).toEqual({
      edition: 7,
      every: null,
    });
  });
});
