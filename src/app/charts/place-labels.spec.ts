import * as fc from 'fast-check';

import { placeLabels, textWidth } from './place-labels';

const label = (id: string, at: number, weight = 0, text = id) => ({ id, text, at, weight });

describe('placeLabels', () => {
  it('leaves a label where it wants to be when there is room', () => {
    expect(placeLabels([label('560', 100)], [0, 300], 1)).toEqual([
      expect.objectContaining({ id: '560', x: 100, line: 0 }),
    ]);
  });

  it('moves a label inside the room', () => {
    const [placed] = placeLabels([label('560', 0)], [0, 300], 1);

    expect(placed?.x).toBe(textWidth('560') / 2);
  });

  it('gives the weightier its place and puts the other on the next line', () => {
    const placed = placeLabels([label('weak', 100, 1), label('loud', 105, 2)], [0, 300], 2);

    expect(placed.map(({ id, line }) => [id, line])).toEqual([
      ['weak', 1],
      ['loud', 0],
    ]);
  });

  it('never lets two labels of a line overlap, nor one leave the room', () => {
    const requests = fc.array(
      fc.record({
        text: fc.string({ minLength: 1, maxLength: 20 }),
        at: fc.integer({ min: -50, max: 450 }),
        weight: fc.integer({ min: 0, max: 90 }),
      }),
      { maxLength: 60 },
    );
    fc.assert(
      fc.property(requests, fc.integer({ min: 1, max: 4 }), (list, lines) => {
        const named = list.map((each, at) => ({ ...each, id: String(at) }));
        const placed = placeLabels(named, [0, 400], lines);
        const edges = placed.map(({ x, text, line }) => ({
          line,
          from: x - textWidth(text) / 2,
          to: x + textWidth(text) / 2,
        }));

        edges.forEach((one, at) => {
          expect(one.from).toBeGreaterThanOrEqual(-1e-9);
          expect(one.to).toBeLessThanOrEqual(400 + 1e-9);
          for (const other of edges.slice(at + 1)) {
            if (other.line !== one.line) continue;
            expect(one.to <= other.from || other.to <= one.from).toBe(true);
          }
        });
      }),
      { numRuns: 100 },
    );
  });
});
