import { pastedCurve } from './pasted-curve';

const point = (offsetHz: number, rejectionDb: number) => ({ offsetHz, rejectionDb });

describe('a pasted curve', () => {
  it.each([
    ['from a spreadsheet', '0\t0\r\n2,5\t3\r\n5\t21,5\r\n'],
    ['between semicolons', '0;0\n2.5;3\n5;21.5'],
    ['between blanks', '0 0\n2.5  3\n5 21.5'],
    ['with units', '0 kHz\t0 dB\n2500 Hz\t3 dB\n0.005 MHz\t21.5 dB'],
    ['with a heading', 'Offset (kHz)\tRejection\n0\t0\n2.5\t3\n5\t21.5'],
    ['with a heading in hertz', 'Offset, Hz\tdB\n0\t0\n2500\t3\n5000\t21.5'],
    ['as a response that falls', '0\t0\n2.5\t-3\n5\t−21.5'],
    ['outermost first', '5\t21.5\n2.5\t3\n0\t0'],
  ])('is read %s', (_how, text) => {
    expect(pastedCurve(text)).toEqual({
      points: [point(0, 0), point(2500, 3), point(5000, 21.5)],
      unread: [],
    });
  });

  it('averages its two sides', () => {
    const found = pastedCurve('-5\t20\n0\t0\n5\t24');

    expect(found?.points).toEqual([point(0, 0), point(5000, 22)]);
  });

  it('names the lines that are no points', () => {
    expect(pastedCurve('kHz\tdB\n0\t0\nwide\t3\n5\t\n9\t60')).toEqual({
      points: [point(0, 0), point(9000, 60)],
      unread: [3, 4],
    });
  });

  it.each(['', '4.5', '4.5 kHz', 'a word'])('is not what one types into a field: "%s"', (text) => {
    expect(pastedCurve(text)).toBeNull();
  });
});
