import { holdsAny } from './embedded-fonts';

describe('the faces a picture needs', () => {
  it.each([
    ['U+0000-00FF, U+0131', 'field', true],
    ['U+0301, U+0400-045F', 'field', false],
    ['U+0301, U+0400-045F', 'Река', true],
    ['U+4??', 'Я', true],
    ['', 'field', true],
  ])('of %j and %j: %s', (range, text, isNeeded) => {
    expect(holdsAny(range, text)).toBe(isNeeded);
  });
});
