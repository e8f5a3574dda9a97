import { describe, expect, it } from 'vitest';

import { BoundedCache } from './bounded-cache.ts';

describe('BoundedCache', () => {
  it('forgets what was used longest ago when the bound is reached', () => {
    const cache = new BoundedCache<string>(10);
    cache.set('a', 'A', 4);
    cache.set('b', 'B', 4);
    cache.get('a');

    cache.set('c', 'C', 4);

    expect([cache.get('a'), cache.get('b'), cache.get('c')]).toEqual(['A', undefined, 'C']);
  });

  it('does not keep what alone is over the bound', () => {
    const cache = new BoundedCache<string>(10);
    cache.set('a', 'A', 4);

    cache.set('huge', 'H', 11);

    expect([cache.get('a'), cache.get('huge')]).toEqual(['A', undefined]);
  });

  it('counts a value that is set again once', () => {
    const cache = new BoundedCache<string>(10);
    for (let turn = 0; turn < 5; turn++) cache.set('a', 'A', 4);

    cache.set('b', 'B', 6);

    expect(cache.get('a')).toBe('A');
  });
});
