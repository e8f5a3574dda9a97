import { inReadingOrder, markByKey, nearestMark, spoken } from './plot-mark';

const marks = [
  { id: 'c', x: 30, y: 5 },
  { id: 'a', x: 10, y: 50 },
  { id: 'b', x: 10, y: 80 },
];

describe('the marks of a plot', () => {
  it('are read from left to right, the upper first', () => {
    expect(inReadingOrder(marks).map(({ id }) => id)).toEqual(['a', 'b', 'c']);
  });

  it('answer to a pointer within reach, the nearest first', () => {
    expect(nearestMark(marks, 12, 70, 24)?.id).toBe('b');
    expect(nearestMark(marks, 12, 60, 24)?.id).toBe('a');
    expect(nearestMark(marks, 200, 200, 24)).toBeUndefined();
  });

  it.each([
    [null, 'ArrowRight', 'a'],
    [null, 'End', 'c'],
    ['a', 'ArrowRight', 'b'],
    ['c', 'ArrowRight', 'c'],
    ['c', 'ArrowLeft', 'b'],
    ['a', 'ArrowLeft', 'a'],
    ['c', 'Home', 'a'],
    ['a', 'PageDown', 'c'],
  ])('from %s, %s leads to %s', (present, key, next) => {
    expect(markByKey(inReadingOrder(marks), present, key)?.id).toBe(next);
  });

  it('ignore other keys, and an empty plot has nowhere to go', () => {
    expect(markByKey(marks, 'a', 'x')).toBeUndefined();
    expect(markByKey([], null, 'ArrowRight')).toBeUndefined();
  });

  it('are spoken with every value and unit', () => {
    const text = spoken({
      title: 'Alder 560',
      lines: [{ label: 'field', value: '72.4 dB(µV/m)' }],
    });

    expect(text).toBe('Alder 560. field: 72.4 dB(µV/m).');
  });
});
