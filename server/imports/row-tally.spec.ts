import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { type KnownRow, RowTally } from './row-tally.ts';

const row = (identity: string, fingerprint: string): KnownRow => ({ identity, fingerprint });

function tallied(known: readonly KnownRow[], offered: readonly KnownRow[]) {
  const tally = new RowTally();
  tally.know(known);
  for (const each of offered) tally.add(each);
  return tally.rows;
}

describe('RowTally', () => {
  it('tells new, changed, same and repeated rows apart', () => {
    const known = [row('a', 'a1'), row('b', 'b1')];
    const offered = [row('a', 'a1'), row('b', 'b2'), row('c', 'c1'), row('c', 'c1')];

    expect(tallied(known, offered)).toMatchObject({
      total: 4,
      new: 1,
      changed: 1,
      same: 1,
      rejected: 0,
      duplicate: 1,
      gone: 0,
    });
    expect(tallied(known, [row('c', 'c1')])).toMatchObject({ new: 1, gone: 2 });
  });

  it('counts several stations of one name and frequency apart', () => {
    const known = [row('a', '1'), row('a', '2')];

    expect(tallied(known, [row('a', '3'), row('a', '1')])).toMatchObject({ same: 1, changed: 1 });
    expect(tallied(known, [row('a', '2'), row('a', '1'), row('a', '3')])).toMatchObject({
      same: 2,
      new: 1,
      changed: 0,
    });
  });

  const rows = fc.array(
    fc.record({ identity: fc.constantFrom('a', 'b', 'c'), serial: fc.nat(3) }),
    { maxLength: 12 },
  );
  const toRow = ({ identity, serial }: { identity: string; serial: number }) =>
    row(identity, `${identity}${serial}`);
  const unique = (list: readonly KnownRow[]) => [
    ...new Map(list.map((each) => [each.fingerprint, each])).values(),
  ];

  it('never depends on the order of rows, and its counts add up', () => {
    fc.assert(
      fc.property(rows, rows, fc.integer(), (known, offered, seed) => {
        const edition = unique(known.map(toRow));
        const list = offered.map(toRow);
        const shuffled = [...list].sort(
          (a, b) =>
            Math.sin(seed * a.fingerprint.charCodeAt(1)) -
            Math.sin(seed * b.fingerprint.charCodeAt(1)),
        );

        const counts = tallied(edition, list);

        expect(tallied(edition, shuffled)).toEqual(counts);
        expect(counts.new + counts.changed + counts.same + counts.duplicate).toBe(list.length);
        expect(counts.changed + counts.same).toBeLessThanOrEqual(edition.length);
      }),
    );
  });
});
