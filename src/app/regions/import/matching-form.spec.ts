import { matchingForm, matchingOf, patternOf, unitsOf } from './matching-form';

const PROPOSED = {
  letterO: null,
  completes: null,
  addsTo: null,
  columns: [
    { header: 'Freq', field: 'frequency' as const, unit: null },
    { header: 'Lat', field: 'latitude' as const, unit: 'degrees' as const },
    { header: 'Owner', field: null, unit: null },
  ],
};

describe('matchingForm', () => {
  it('offers the units of what a column holds, none for text or for a column left out', () => {
    const { controls } = matchingForm(PROPOSED).controls.columns;

    expect(controls.map(unitsOf)).toEqual([['kHz', 'MHz', 'Hz'], ['degrees', 'dms'], []]);
  });

  it('sends every column in the order of the file', () => {
    expect(matchingOf(matchingForm(PROPOSED))).toEqual({ columns: PROPOSED.columns, addsTo: null });
  });

  it('does not send a unit that belonged to another field', () => {
    const form = matchingForm(PROPOSED);

    form.controls.columns.at(1).controls.field.setValue('name');

    expect(matchingOf(form).columns?.[1]).toEqual({ header: 'Lat', field: 'name', unit: null });
  });

  it('adds mended rows to the edition they came from, unless one objects', () => {
    const form = matchingForm({ ...PROPOSED, completes: { editionId: 4, label: 'Spring' } });

    expect(matchingOf(form).addsTo).toBe(4);
    form.controls.addsTo.setValue(null);
    expect(matchingOf(form).addsTo).toBeNull();
  });

  it('leaves an open letter O to be answered', () => {
    const form = matchingForm({ ...PROPOSED, letterO: 'open' });

    expect(matchingOf(form)).not.toHaveProperty('letterO');
    form.controls.letterO.setValue('east');
    expect(matchingOf(form).letterO).toBe('east');
  });

  it('knows the columns of a pattern', () => {
    const bearings = ['az0', 'az90'].map((header) => ({
      header,
      field: 'pattern' as const,
      unit: null,
    }));
    const { controls } = matchingForm({ ...PROPOSED, columns: bearings }).controls.columns;

    expect(patternOf(controls)).toHaveLength(2);
  });
});
