import { awaitedWords } from './awaited-words';

describe('what stands over a judgement that is being replaced', () => {
  it('names the IF it is computed for and the one it still holds for', () => {
    expect(awaitedWords(562_000, 560_000)).toBe(
      'Being computed for 562\u00a0kHz. What is dimmed still holds for 560\u00a0kHz.',
    );
  });

  it('names no IF when something else was changed', () => {
    expect(awaitedWords(560_000, 560_000)).toBe(
      'Being computed. What is dimmed was drawn before the change.',
    );
  });
});
