import { describe, expect, it } from 'vitest';

import { defuse } from './csv-answer.ts';

describe('defuse', () => {
  it.each(['=HYPERLINK("x")', '+cmd', '-cmd|x', '@SUM(A1)', '\t=1', '+', '-x', '=1'])(
    'keeps a spreadsheet from running %s',
    (cell) => {
      expect(defuse(cell)).toBe(`'${cell}`);
    },
  );

  it.each(['-1', '+5', '-0,25', '-1.5e3', 'Radio', '', '612'])('leaves %s as it is', (cell) => {
    expect(defuse(cell)).toBe(cell);
  });
});
