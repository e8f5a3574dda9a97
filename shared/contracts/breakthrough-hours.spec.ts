import { describe, expect, it } from 'vitest';

import { momentsOf } from './breakthrough-hours.ts';

describe('momentsOf', () => {
  it('is every half-hour of the day in UTC, every hour for a long list', () => {
    const [short, long] = [momentsOf('2026-12-21', 20_000), momentsOf('2026-12-21', 20_001)];

    expect(short).toHaveLength(48);
    expect(short[1]?.toISOString()).toBe('2026-12-21T00:30:00.000Z');
    expect(long).toHaveLength(24);
    expect(long.at(-1)?.toISOString()).toBe('2026-12-21T23:00:00.000Z');
  });
});
