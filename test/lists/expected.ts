import type { ImportCheck, ImportMatching } from '../../shared/contracts/list-import.ts';
import {
  alder,
  ferry,
  quay,
  ridge,
  south,
  steady,
  thousands,
  type StationTuple,
} from './stations.ts';

/** How a file of this folder is to be read. */
export interface ExpectedList {
  readonly file: string;
  /** What the proposal says beside `complete`. */
  readonly found?: Readonly<Record<string, unknown>>;
  /** Paths of what is asked, and the answers. */
  readonly asks?: readonly string[];
  readonly answers?: ImportMatching;
  /** Counts; what is not named is zero. */
  readonly rows: Partial<ImportCheck['rows']>;
  readonly remarks?: readonly (readonly [RegExp, number])[];
  /** Stations in the order of their frequency: name or call sign, Hz, latitude, longitude, W, W. */
  readonly stations: readonly StationTuple[];
}

const all = (count: number) => ({ total: count, new: count });
const field = (
  header: string,
  name: 'name' | 'frequency' | 'power',
  unit: 'kHz' | 'kW' | null,
) => ({
  header,
  field: name,
  unit,
});

export const LISTS: readonly ExpectedList[] = [
  { file: '01-plain.csv', rows: all(3), stations: [ferry(), alder(), quay()] },
  {
    file: '02-central-spreadsheet.csv',
    found: { encoding: 'windows-1252', delimiter: ';', decimalMark: ',' },
    rows: { ...all(3), offRaster: 1 },
    stations: [
      ferry('F\u00e4hrhafen'),
      alder('Erlenr\u00fccken'),
      ['Nordkai', 747_500, 46.98, 7.45, 100_000, 100_000],
    ],
  },
  {
    file: '03-utf16-tabs.txt',
    found: { encoding: 'UTF-16LE', delimiter: '\t' },
    rows: all(2),
    stations: [steady(), ['\u017d\u010f\u00e1rek', 621_000, 49.56, 15.93, 1500, 1500]],
  },
  {
    file: '04-utf16-unmarked.csv',
    found: { encoding: 'UTF-16BE' },
    rows: all(2),
    stations: [ferry(), alder()],
  },
  {
    file: '05-bars-and-hours.txt',
    found: { delimiter: '|' },
    rows: { total: 4, new: 3, merged: 1 },
    remarks: [
      [/were read as one/, 1],
      [/silent by night/, 1],
    ],
    stations: [
      steady('XQFP'),
      ['XQAR', 621_000, 47.9, 8.4, 5000, 500],
      ['XQNQ', 747_000, 46.98, 7.45, 1000, 0],
    ],
  },
  {
    file: '06-windows-1250.csv',
    found: { encoding: 'windows-1250', decimalMark: ',' },
    rows: all(4),
    stations: [
      ['\u017b\u00f3\u0142ta G\u00f3ra', 612_000, 52.41, 16.93, 50_000, 10_000],
      ['\u015awi\u0119ty D\u0105b', 621_000, 51.11, 17.03, 1500, 0],
      ['\u0141\u00f3d\u017a Po\u0142udnie', 747_000, 51.76, 19.46, 100_000, 100_000],
      ['\u0179r\u00f3d\u0142o \u015al\u0105skie', 801_000, 50.26, 19.02, 5000, 5000],
    ],
  },
  {
    file: '07-iso-8859-2.csv',
    found: { encoding: 'ISO-8859-2' },
    rows: all(4),
    stations: [
      ['\u017d\u010f\u00e1rek', 612_000, 49.56, 15.93, 50_000, 50_000],
      ['\u0160umn\u00fd D\u016fl', 621_000, 49.19, 16.61, 1500, 1500],
      ['\u0164uh\u00fdkov', 747_000, 50.08, 14.43, 100_000, 100_000],
      ['\u010cesk\u00e1 Lhota', 801_000, 50.2, 15.8, 5000, 5000],
    ],
  },
  {
    file: '08-iso-8859-15.csv',
    found: { encoding: 'ISO-8859-15' },
    rows: all(3),
    stations: [
      ['Sacr\u00e9-C\u0153ur', 612_000, 47.31, 2.05, 50_000, 50_000],
      ['Vieux B\u0153uf', 621_000, 47.9, 3.4, 1500, 1500],
      ['N\u0153ud du Ch\u00eane', 747_000, 46.98, 4.45, 100_000, 100_000],
    ],
  },
  {
    file: '09-quoted-lines.csv',
    rows: all(3),
    stations: [ferry(), alder('The "Old" Mill'), quay('Quay, north')],
  },
  {
    file: '10-points-for-thousands.csv',
    found: { decimalMark: ',' },
    rows: all(3),
    stations: thousands('F\u00e4hrhafen', 'Erlenr\u00fccken', 'Nordkai'),
  },
  {
    file: '11-commas-for-thousands.csv',
    found: { decimalMark: '.' },
    rows: all(3),
    stations: thousands('Ferry Point', 'Alder Ridge', 'Northquay'),
  },
  {
    file: '12-spaces-for-thousands.csv',
    found: { decimalMark: ',' },
    rows: all(3),
    stations: thousands('Bac du Nord', 'Cr\u00eate', 'Quai'),
  },
  {
    file: '13-apostrophes-for-thousands.csv',
    found: { decimalMark: '.' },
    rows: all(3),
    stations: thousands('F\u00e4hrhafen', 'Erlenr\u00fccken', 'Nordkai'),
  },
  {
    file: '14-megahertz.csv',
    rows: all(3),
    stations: [
      ['Puerto Viejo', 612_000, 41.31, -2.05, 50_000, 10_000],
      ['Sierra Alta', 621_000, 41.9, -3.4, 1500, 0],
      ['Muelle', 1_359_000, 40.98, -4.45, 100_000, 100_000],
    ],
  },
  {
    file: '15-unit-not-said.csv',
    asks: ['columns.1.unit', 'columns.2.unit'],
    answers: {
      columns: [
        field('station', 'name', null),
        field('frequency', 'frequency', 'kHz'),
        field('power', 'power', 'kW'),
      ],
    },
    rows: { ...all(2), withoutPlace: 2 },
    stations: [
      ['Ferry Point', 612_000, null, null, 50_000, 50_000],
      ['Alder Ridge', 621_000, null, null, 2000, 2000],
    ],
  },
  {
    file: '16-decibel-watts.csv',
    rows: { ...all(3), withoutPower: 1 },
    stations: [
      ['Ferry Point', 612_000, 47.31, 8.05, 50_118.7233627, 50_118.7233627],
      ['Alder Ridge', 621_000, 47.9, 8.4, 1000, 1000],
      ['Silent Mast', 630_000, 47.9, 8.5, null, null],
    ],
  },
  { file: '17-units-in-cells.csv', rows: all(3), stations: [steady(), ridge(), quay()] },
  { file: '18-degree-signs.csv', rows: all(3), stations: [steady(), ridge(), south()] },
  { file: '19-letters-before.csv', rows: all(3), stations: [steady(), ridge(), south()] },
  { file: '20-hyphens-and-colons.csv', rows: all(3), stations: [steady(), ridge(), quay()] },
  { file: '21-packed-with-letters.csv', rows: all(3), stations: [steady(), ridge(), south()] },
  { file: '22-letter-between.csv', rows: all(3), stations: [steady(), ridge(), south()] },
  {
    file: '23-packed-digits.csv',
    rows: all(3),
    stations: [steady(), ridge(), ['Northquay', 747_000, 46.98, -7.45, 100_000, 100_000]],
  },
  {
    file: '24-o-beside-w.csv',
    found: { letterO: 'east' },
    rows: all(2),
    stations: [steady('F\u00e4hrhafen'), ['Westhorn', 621_000, 47.9, -3.4, 1500, 1500]],
  },
  {
    file: '25-o-alone.csv',
    found: { letterO: 'open' },
    asks: ['letterO'],
    answers: { letterO: 'west' },
    rows: all(2),
    stations: [
      ['Pointe', 612_000, 47.31, -2.05, 50_000, 50_000],
      ['Rocher', 621_000, 47.9, -3.4, 1500, 1500],
    ],
  },
  {
    file: '26-locators.csv',
    rows: all(3),
    stations: [
      ['Ferry Point', 612_000, 47.3125, 8.0416667, 500, 500],
      ['Alder Ridge', 621_000, 47.5, 9, 50, 50],
      ['Northquay', 630_000, 46.98125, 7.4625, 5, 5],
    ],
  },
  {
    file: '27-titles-and-footers.csv',
    found: { headerLine: 4 },
    rows: all(2),
    remarks: [
      [/above the column headers/, 2],
      [/closing lines/, 2],
    ],
    stations: [steady(), ridge()],
  },
  { file: '28-units-below.csv', rows: all(2), stations: [ferry(), alder()] },
  {
    file: '29-spanish-latin1.csv',
    found: { encoding: 'windows-1252' },
    rows: all(2),
    stations: [
      ['Pe\u00f1\u00f3n', 612_000, 41.31, -2.05, 50_000, 10_000],
      ['Sierra Ni\u00f1o', 621_000, 41.9, 3.4, 1500, 0],
    ],
  },
  {
    file: '30-day-and-night-rows.csv',
    rows: { total: 6, new: 4, merged: 1, rejected: 1 },
    remarks: [
      [/were read as one/, 1],
      [/silent by night/, 1],
      [/silent by day/, 1],
    ],
    stations: [
      ferry(),
      ['Alder Ridge', 621_000, 47.9, 8.4, 5000, 0],
      ['Alder Ridge', 621_000, 46.1, 8.4, 0, 1000],
      quay(),
    ],
  },
  {
    file: '31-critical-hours.csv',
    rows: { total: 4, new: 2, merged: 2, withoutPlace: 2 },
    remarks: [
      [/were read as one/, 1],
      [/critical hours/, 1],
    ],
    stations: [
      ['XQFP', 612_000, null, null, 50_000, 10_000],
      ['XQAR', 621_000, null, null, 5000, 5000],
    ],
  },
  {
    file: '32-pattern-decibels.csv',
    asks: ['columns.5.unit'],
    answers: patternAnswers('dB'),
    rows: all(2),
    stations: [steady(), ridge()],
  },
  {
    file: '33-relative-field.csv',
    asks: ['columns.5.unit'],
    answers: patternAnswers('relative'),
    rows: all(2),
    stations: [steady(), ridge()],
  },
  {
    file: '34-power-by-bearing.csv',
    rows: { ...all(2), withoutPower: 1 },
    stations: [steady(), ['Alder Ridge', 621_000, 47.9, 8.4, null, null]],
  },
  {
    file: '35-without-place-or-power.csv',
    rows: { ...all(3), offRaster: 1, withoutPlace: 2, withoutPower: 2 },
    stations: [
      ['Ferry Point', 612_000, null, null, 50_000, 10_000],
      ['Alder Ridge', 621_000, 47.9, 8.4, null, null],
      ['Northquay', 748_000, null, null, null, null],
    ],
  },
  {
    file: '36-ragged.csv',
    rows: { total: 3, new: 2, rejected: 1, withoutPower: 1 },
    remarks: [[/shorter than the header/, 1]],
    stations: [['Ferry Point', 612_000, 47.31, 8.05, null, null], quay()],
  },
  {
    file: '37-headers-again.csv',
    rows: all(2),
    remarks: [
      [/closing lines/, 2],
      [/said again/, 1],
    ],
    stations: [ferry(), alder()],
  },
  {
    file: '38-formulas.csv',
    rows: all(2),
    stations: [ferry('=HYPERLINK("http://lakes.example")'), alder('@Quay')],
  },
  {
    file: '39-repeated-by-cr.csv',
    rows: { total: 3, new: 2, duplicate: 1 },
    stations: [ferry(), ['Ferry Point', 612_000, 46.31, 8.05, 50_000, 10_000]],
  },
  {
    file: '40-ouest-and-est.csv',
    found: { letterO: 'west' },
    rows: all(2),
    stations: [
      ['Pointe', 612_000, 47.31, -2.05, 50_000, 50_000],
      ['Rocher', 621_000, 47.9, 3.4, 1500, 1500],
    ],
  },
  {
    file: '41-czech-words.csv',
    rows: all(2),
    stations: [
      ['\u017d\u010f\u00e1rek', 612_000, 49.56, 15.93, 50_000, 10_000],
      ['K\u00e1men', 621_000, 49.19, 16.61, 1500, 0],
    ],
  },
  {
    file: '42-unknown-headers.csv',
    asks: ['columns'],
    answers: {
      columns: [
        field('alpha', 'name', null),
        field('beta', 'frequency', 'kHz'),
        field('gamma', 'power', 'kW'),
      ],
    },
    rows: { ...all(2), withoutPlace: 2 },
    stations: [
      ['Ferry Point', 612_000, null, null, 50_000, 50_000],
      ['Alder Ridge', 621_000, null, null, 2000, 2000],
    ],
  },
  {
    file: '43-bad-rows.csv',
    rows: { total: 6, new: 1, rejected: 5 },
    stations: [['Good Hope', 774_000, 46.9, 7.4, 1000, 1000]],
  },
  {
    file: '44-parts-in-columns.csv',
    rows: { total: 6, new: 4, rejected: 2, withoutPlace: 1 },
    stations: [
      steady('XQFP'),
      ridge('XQAR'),
      south('XQNQ'),
      ['XQBL', 756_000, null, null, 1000, 1000],
    ],
  },
  {
    file: '45-signs-and-letters.csv',
    found: { encoding: 'windows-1252', decimalMark: ',', letterO: 'east' },
    rows: all(3),
    stations: [steady('F\u00e4hrhafen'), ridge('Erlenr\u00fccken'), south('Nordkai')],
  },
  { file: '46-letters-beside.csv', rows: all(3), stations: [steady(), ridge(), south()] },
  {
    file: '47-both-in-one-cell.csv',
    found: { decimalMark: ',' },
    rows: { total: 6, new: 4, rejected: 2, withoutPlace: 1 },
    stations: [
      steady(),
      ridge(),
      ['Southquay', 756_000, -46.9666667, -7.45, 100_000, 100_000],
      ['Nowhere', 765_000, null, null, 1000, 1000],
    ],
  },
];

/** Said of the first bearing, the unit holds for all. */
function patternAnswers(unit: 'dB' | 'relative'): ImportMatching {
  const isFine = unit === 'dB';
  const place = isFine ? ['latitude', 'longitude'] : ['Lat', 'Lon'];
  const bearings = Array.from({ length: isFine ? 36 : 12 }, (_, index) =>
    isFine ? `pattern_${String(index * 10).padStart(3, '0')}` : `Az ${index * 30}\u00b0`,
  );
  return {
    columns: [
      field(isFine ? 'name' : 'Station', 'name', null),
      field(isFine ? 'frequency_khz' : 'kHz', 'frequency', 'kHz'),
      { header: place[0] ?? '', field: 'latitude', unit: null },
      { header: place[1] ?? '', field: 'longitude', unit: null },
      field(isFine ? 'power_kw' : 'kW', 'power', 'kW'),
      ...bearings.map((header, index) => ({
        header,
        field: 'pattern' as const,
        unit: index === 0 ? unit : null,
      })),
    ],
  };
}
