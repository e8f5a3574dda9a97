import * as fc from 'fast-check';
import { scaleLinear, scaleLog } from 'd3';

import { textWidth } from './place-labels';
import { numerals, scaleMarks } from './scale-marks';

const khz = (marks: readonly { hz: number }[]) => marks.map(({ hz }) => hz / 1000);

describe('scaleMarks', () => {
  it('puts round numerals on a linear scale', () => {
    const position = scaleLinear([400_000, 500_000], [0, 600]);

    expect(khz(scaleMarks(position, 400_000, 500_000, 50))).toEqual([
      400, 410, 420, 430, 440, 450, 460, 470, 480, 490, 500,
    ]);
  });

  it('is finer where a logarithmic scale has room', () => {
    const position = scaleLog([550_000, 1_600_000], [0, 600]);
    const marks = khz(scaleMarks(position, 550_000, 1_600_000, 40));

    expect(marks).toEqual(expect.arrayContaining([600, 700, 800, 900, 1000, 1500]));
    expect(marks).not.toContain(1550);
  });

  it('keeps the distance asked for on any scale', () => {
    const ends = fc.tuple(
      fc.integer({ min: 10_000, max: 30_000_000 }),
      fc.integer({ min: 2_000, max: 20_000_000 }),
    );
    fc.assert(
      fc.property(
        ends,
        fc.integer({ min: 4, max: 80 }),
        fc.boolean(),
        ([low, span], gap, isLog) => {
          const domain = [low, low + span];
          const position = isLog ? scaleLog(domain, [0, 700]) : scaleLinear(domain, [0, 700]);
          const marks = scaleMarks(position, low, low + span, gap);

          marks.forEach(({ hz, at }, index) => {
            expect(hz).toBeGreaterThanOrEqual(low);
            expect(hz).toBeLessThanOrEqual(low + span);
            if (index > 0) expect(at - (marks[index - 1]?.at ?? 0)).toBeGreaterThanOrEqual(gap);
          });
        },
      ),
      { numRuns: 200 },
    );
  });

  it('has nothing to mark on an empty range', () => {
    expect(scaleMarks((hz) => hz, 5000, 5000, 10)).toEqual([]);
  });
});

describe('numerals', () => {
  it('stand closer on a narrow screen by another step, not by overlapping', () => {
    const position = scaleLinear([420_000, 500_000], [0, 313]);
    const texts = numerals(position, 420_000, 500_000, (hz) => String(hz / 1000));

    expect(texts.map(({ text }) => text)).toEqual([
      '420',
      '430',
      '440',
      '450',
      '460',
      '470',
      '480',
      '490',
      '500',
    ]);
  });

  it('keep clear of one another however long they are', () => {
    const position = scaleLinear([455_000, 456_000], [0, 500]);
    const found = numerals(position, 455_000, 456_000, (hz) => (hz / 1000).toFixed(3));

    expect(found.length).toBeGreaterThan(2);
    found.slice(1).forEach(({ at, text }, index) => {
      expect(at - (found[index]?.at ?? 0)).toBeGreaterThan(textWidth(text));
    });
  });
});
