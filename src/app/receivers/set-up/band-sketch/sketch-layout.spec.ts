import { receiverControls } from '../receiver-form/controls';
import { writeFields } from '../receiver-form/fields';
import { sketchMarks, sketchRows, sketchScale } from './sketch-layout';

function fieldsOf(oscillator: 'above' | 'below', lowHz: number | null = 520_000) {
  const form = receiverControls();
  const band = { name: 'MW', lowHz, highHz: 1_600_000, oscillator, circuits: [] };
  writeFields(form, { ifHz: 110_000, bands: [band] });
  return form.getRawValue();
}

describe('the sketch of the bands', () => {
  it('puts the images twice the IF away, on the oscillator’s side', () => {
    expect(sketchRows(fieldsOf('above'))[0]?.image).toEqual([740_000, 1_820_000]);
    expect(sketchRows(fieldsOf('below'))[0]?.image).toEqual([300_000, 1_380_000]);
  });

  it('leaves out a band that is not finished', () => {
    expect(sketchRows(fieldsOf('above', null))).toEqual([]);
  });

  it.each([0, -455_000])(
    'leaves out what has no place on its scale, like an IF of %i Hz',
    (ifHz) => {
      expect(sketchRows({ ...fieldsOf('above'), ifHz })).toEqual([]);
      expect(sketchRows(fieldsOf('above', ifHz))).toEqual([]);
    },
  );

  it('has room for the IF as well, and numerals that do not touch', () => {
    const scale = sketchScale(sketchRows(fieldsOf('above')), 110_000, 400);
    const marks = sketchMarks(scale, 48);

    expect(scale(110_000)).toBeGreaterThan(0);
    expect(marks.map(({ hz }) => hz)).toEqual([1e5, 2e5, 5e5, 1e6, 2e6]);
    marks.slice(1).forEach(({ at }, index) => {
      expect(at - (marks[index]?.at ?? 0)).toBeGreaterThanOrEqual(48);
    });
  });
});
