import { convertToParamMap } from '@angular/router';

import {
  asked,
  changeParams,
  isFiltered,
  noFilters,
  orderOf,
  stationQueryFrom,
} from './edition-address';

const from = (params: Record<string, string>) => stationQueryFrom(convertToParamMap(params));

describe('an address of an edition', () => {
  it('asks for the first page by frequency when it says nothing', () => {
    expect(from({})).toMatchObject({ page: 1, sort: 'frequency', corrections: 'applied' });
    expect(asked(from({}))).toEqual({});
  });

  it('is written as it was read', () => {
    const said = { page: '3', fromHz: '600000', site: '4', period: 'day', minFieldDb: '-12.5' };

    expect(asked(from(said))).toEqual(said);
  });

  it('keeps what makes sense beside what does not', () => {
    const query = from({ fromHz: 'low', only: 'loud', search: 'ferry', station: '9' });

    expect(asked(query)).toEqual({ search: 'ferry' });
  });

  it('loses what is set back to the usual', () => {
    expect(changeParams({ search: '', page: 1, toHz: undefined, site: 4 })).toEqual({
      search: null,
      page: null,
      toHz: null,
      site: '4',
    });
  });

  it('counts what narrows the list down as a filter, and neither site nor order', () => {
    expect(isFiltered(from({ site: '4', sort: 'name', page: '2' }))).toBe(false);
    expect(isFiltered(from({ only: 'off-raster' }))).toBe(true);
    expect(noFilters).toMatchObject({ only: null, search: null, page: null });
    expect(noFilters).not.toHaveProperty('site');
  });
});

describe('the order of an edition', () => {
  it.each([
    ['frequency', 'asc'],
    ['distance', 'asc'],
    ['power', 'desc'],
    ['field', 'desc'],
  ] as const)('by %s begins %s when nothing is said', (sort, direction) => {
    expect(orderOf({ sort })).toEqual({ sort, direction });
  });
});
