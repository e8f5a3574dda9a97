import { outcomeOf } from './comparison';

describe('the outcome of a term', () => {
  it('is better or worse by what is good in it', () => {
    expect(outcomeOf('deficit', [40, 12], false)).toBe('better');
    expect(outcomeOf('deficit', [12, 40], false)).toBe('worse');
    expect(outcomeOf('image', [20, 34], false)).toBe('better');
    expect(outcomeOf('image', [34, 20], false)).toBe('worse');
  });

  it('takes silence for the best ratio', () => {
    expect(outcomeOf('image', [20, null], false)).toBe('better');
    expect(outcomeOf('image', [null, 20], false)).toBe('worse');
  });

  it('only differs where a figure is not known or has no better', () => {
    expect(outcomeOf('tracking', [null, 2], false)).toBe('differs');
    expect(outcomeOf('harmonic', [1000, 4000], false)).toBe('differs');
  });

  it('is the same where both read the same', () => {
    expect(outcomeOf('deficit', [1.01, 1.02], true)).toBe('same');
  });
});
