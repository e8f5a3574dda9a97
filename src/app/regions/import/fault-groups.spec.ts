import { groupFaults } from './fault-groups';

const fault = (line: number, column: string, expected: string) => ({
  line,
  column,
  value: `v${line}`,
  expected,
});

describe('groupFaults', () => {
  it('puts faults of one column and one expectation together, the commonest cause first', () => {
    const groups = groupFaults([
      fault(9, 'Lat', 'degrees'),
      fault(7, 'Freq', 'a frequency in kHz'),
      fault(3, 'Freq', 'a frequency in kHz'),
    ]);

    expect(groups.map(({ column, faults }) => [column, faults.map(({ line }) => line)])).toEqual([
      ['Freq', [3, 7]],
      ['Lat', [9]],
    ]);
  });

  it('keeps two causes in one column apart', () => {
    const groups = groupFaults([fault(2, 'Lat', 'degrees'), fault(3, 'Lat', 'a latitude')]);

    expect(groups).toHaveLength(2);
  });

  it('counts what is not told one by one', () => {
    const cause = { column: 'Lat', expected: 'degrees', count: 3000, lines: [2] };

    const [group] = groupFaults([fault(2, 'Lat', 'degrees')], [cause]);

    expect(group).toMatchObject({ count: 3000, faults: [{ line: 2 }] });
  });

  it('makes nothing of nothing', () => {
    expect(groupFaults([])).toEqual([]);
  });
});
