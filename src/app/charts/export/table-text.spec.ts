import { parse } from 'csv-parse/sync';

import { plainCell, tableAsCsv, tableAsTabs } from './table-text';

const table = {
  columns: ['Station', 'Field, dB(µV/m)', 'Note'],
  rows: [
    { id: 'a', cells: ['Alder, "560"', '\u221212.4', '\u2013'] },
    { id: 'b', cells: ['=HYPERLINK("x")', '72.4', 'two\nlines'] },
    { id: 'c', cells: ['@Quorrel', '1000', '+3.2 dB'] },
  ],
};
const facts = [
  { label: 'Receiver', value: 'Fennimore, 12 valves' },
  { label: 'Time', value: 'night' },
];

describe('the rows of a chart as CSV', () => {
  it('are read again as the same rows, with what they rest on', () => {
    const read: string[][] = parse(tableAsCsv(table, facts));

    expect(read).toEqual([
      ['Station', 'Field, dB(µV/m)', 'Note', 'Receiver', 'Time'],
      ['Alder, "560"', '-12.4', '', 'Fennimore, 12 valves', 'night'],
      [`'=HYPERLINK("x")`, '72.4', 'two\nlines', 'Fennimore, 12 valves', 'night'],
      [`'@Quorrel`, '1000', `'+3.2 dB`, 'Fennimore, 12 valves', 'night'],
    ]);
  });

  it('go to the clipboard with tabs between the cells', () => {
    expect(tableAsTabs({ columns: ['A', 'B'], rows: [{ id: '1', cells: ['x', '\u22121'] }] })).toBe(
      'A\tB\nx\t-1',
    );
  });
});

describe('plainCell', () => {
  it.each([
    ['\u22120.5', '-0.5'],
    ['-3', '-3'],
    ['554', '554'],
    ['\u2013', ''],
    ['-cmd', "'-cmd"],
    ['\u22123 dB', '\u22123 dB'],
    ['\tx', "'\tx"],
    ['plain', 'plain'],
  ])('writes %j as %j', (text, cell) => {
    expect(plainCell(text)).toBe(cell);
  });
});
