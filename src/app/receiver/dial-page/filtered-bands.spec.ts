import type { JudgedBand, JudgedResponse } from '../../charts/band-strip/strip-layout';
import { filteredBands, leftOut } from './filtered-bands';

const response = (changes: Partial<JudgedResponse>): JudgedResponse =>
  ({ station: 1, cause: 'image', grade: 'annoying', hidden: null, ...changes }) as JudgedResponse;

const responses = [
  response({}),
  response({ station: 2, cause: 'half-if', grade: 'hidden', hidden: 'noise' }),
  response({ station: 3, secondStation: 1, cause: 'intermodulation', grade: null }),
];
const bands = [{ name: 'Medium wave', responses } as unknown as JudgedBand];
const all = { causes: [], grades: [], station: '', isHiddenShown: true };
const nameOf = (id: number) => ['', 'Alder', 'Birch', 'Cedar'][id] ?? '';

const stations = (filter: Partial<typeof all> & object) =>
  filteredBands(bands, { ...all, ...filter }, nameOf).flatMap((band) =>
    band.responses.map(({ station }) => station),
  );

describe('the filter of the dial', () => {
  it('lets everything through where nothing is chosen', () => {
    expect(stations({})).toEqual([1, 2, 3]);
  });

  it('leaves out what is hidden', () => {
    expect(stations({ isHiddenShown: false })).toEqual([1, 3]);
  });

  it('goes by cause and by grade', () => {
    expect(filteredBands(bands, { ...all, causes: ['half-if'] }, nameOf)[0]?.responses).toEqual([
      responses[1],
    ]);
    expect(filteredBands(bands, { ...all, grades: ['annoying'] }, nameOf)[0]?.responses).toEqual([
      responses[0],
    ]);
  });

  it('finds either station of a pair by part of its name', () => {
    expect(stations({ station: ' ald' })).toEqual([1, 3]);
    expect(stations({ station: 'yew' })).toEqual([]);
  });

  it('counts what it leaves out', () => {
    expect(leftOut(bands, filteredBands(bands, { ...all, isHiddenShown: false }, nameOf))).toBe(1);
  });
});
