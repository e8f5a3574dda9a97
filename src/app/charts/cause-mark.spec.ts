import { cause } from '../../../shared/contracts/assessment';
import { causeMark, causeMarks } from './cause-mark';

describe('the marks of the causes', () => {
  it('exist for every cause the contract knows', () => {
    expect(cause.options.map((each) => causeMark(each).cause)).toEqual(cause.options);
  });

  it('differ by shape, by dash and by words, so that hue alone never tells', () => {
    const distinct = (values: readonly string[]) => new Set(values).size;

    expect(distinct(causeMarks.map(({ path }) => path))).toBe(causeMarks.length);
    expect(distinct(causeMarks.map(({ dash }) => dash))).toBe(causeMarks.length);
    expect(distinct(causeMarks.map(({ label }) => label))).toBe(causeMarks.length);
  });

  it('use at most five hues', () => {
    expect(new Set(causeMarks.map(({ colour }) => colour)).size).toBeLessThanOrEqual(5);
  });
});
