import { describe, expect, it } from 'vitest';

import { withoutSecret } from './request-log.ts';

describe('a path in the log', () => {
  it('lacks the secret of a link to a shared plan', () => {
    expect(withoutSecret('/api/shared-plans/abc')).toBe('/api/shared-plans/…');
    expect(withoutSecret('/shared/abc/x')).toBe('/shared/…');
  });

  it('is whole otherwise', () => {
    expect(withoutSecret('/api/receivers/7/plans')).toBe('/api/receivers/7/plans');
  });
});
