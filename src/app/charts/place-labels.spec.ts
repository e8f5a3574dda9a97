import * as fc from 'fast-check';

import { labelBox, placeLabels, textWidth } from './place-labels';

const label = (id: string, x: number, weight = 0) => ({
  id,
  text: id,
  weight,
  spots: [
    { x, y: 0 },
    { x, y: 20 },
  ],
});

describe('placeLabels', () => {
  it('leaves a label where it wants to be when there is room', () => {
    expect(placeLabels([label('560', 100)], [0, 300])).toEqual([
      { id: '560', text: '560', x: 100, y: 0 },
    ]);
  });

  it('moves a label inside the room', () => {
    const [placed] = placeLabels([label('560', 0)], [0, 300]);

    expect(placed?.x).toBe(textWidth('560') / 2);
  });

  it('gives the weightier the better spot', () => {
    const placed = placeLabels([label('weak', 100, 1), label('loud', 105, 2)], [0, 300]);

    expect(placed.map(({ id, y }) => [id, y])).toEqual([
      ['weak', 20],
      ['loud', 0],
    ]);
  });

  it('keeps clear of what is taken, and leaves out what finds no room', () => {
    const wall = { left: 0, right: 300, top: -100, bottom: 100 };

    expect(placeLabels([label('560', 100)], [0, 300], [wall])).toEqual([]);
  });

  it('never lets two labels overlap, nor one leave the room', () => {
    const spot = fc.record({
      x: fc.integer({ min: -50, max: 450 }),
      y: fc.integer({ min: 0, max: 120 }),
    });
    const requests = fc.array(
      fc.record({
        text: fc.string({ minLength: 1, maxLength: 20 }),
        spots: fc.array(spot, { minLength: 1, maxLength: 4 }),
        weight: fc.integer({ min: 0, max: 90 }),
      }),
      { maxLength: 60 },
    );
    fc.assert(
      fc.property(requests, (list) => {
        const named = list.map((each, at) => ({ ...each, id: String(at) }));
        const placed = placeLabels(named, [0, 400]);
        const boxes = placed.map((each) => labelBox(each));

        boxes.forEach((one, at) => {
          const { x = 0, text = '' } = placed[at] ?? {};
          expect(x - textWidth(text) / 2).toBeGreaterThanOrEqual(-1e-9);
          expect(x + textWidth(text) / 2).toBeLessThanOrEqual(400 + 1e-9);
          for (const other of boxes.slice(at + 1)) {
            const isApart =
              one.right <= other.left ||
              other.right <= one.left ||
              one.bottom <= other.top ||
              other.bottom <= one.top;
            expect(isApart).toBe(true);
          }
        });
      }),
      { numRuns: 100 },
    );
  });
});
