import { matchingForm, matchingOf, unitsOf } from './matching-form';

const COLUMNS = [
  { header: 'Freq', field: 'frequency', unit: null },
  { header: 'Lat', field: 'latitude', unit: 'degrees' },
  { header: 'Owner', field: null, unit: null },
] as const;

describe('matchingForm', () => {
  it('offers the units of what a column holds, none for text or for a column left out', () => {
    const { controls } = matchingForm(COLUMNS).controls.columns;

    expect(controls.map(unitsOf)).toEqual([['kHz', 'MHz', 'Hz'], ['degrees', 'dms'], []]);
  });

  it('sends every column in the order of the file', () => {
    expect(matchingOf(matchingForm(COLUMNS))).toEqual(COLUMNS);
  });

  it('does not send a unit that belonged to another field', () => {
    const form = matchingForm(COLUMNS);

    form.controls.columns.at(1).controls.field.setValue('name');

    expect(matchingOf(form)?.[1]).toEqual({ header: 'Lat', field: 'name', unit: null });
  });
});
