import { describe, expect, it } from 'vitest';

import { plainBand, plainReceiver } from '../../../test/support/plain-sets.ts';
import { outOfReach } from './if-reach.ts';

describe('outOfReach', () => {
  it('gives the value of its example', () => {
    expect(outOfReach(plainReceiver({ ifHz: 560_000 }), 555_000)).toBeNull();
  });

  it('counts the limit of the IF transformers as within reach', () => {
    const receiver = plainReceiver({ ifHz: 500_000, ifRange: 0.06 });

    expect(outOfReach(receiver, 530_000)).toBeNull();
    expect(outOfReach(receiver, 470_000)).toBeNull();
    expect(outOfReach(receiver, 530_001)).toMatch(/reach 6 %/);
  });

  it('refuses to leave a fixed filter', () => {
    const fixedFilter = { kind: 'mechanical', centreHz: 455_000, widthHz: 6_000 } as const;
    const receiver = plainReceiver({ fixedFilter });

    expect(outOfReach(receiver, 458_000)).toBeNull();
    expect(outOfReach(receiver, 458_001)).toMatch(/mechanical filter/);
  });

  it('asks the beat oscillator to follow', () => {
    const bfo = { centreHz: 455_000, rangeHz: 2_000, pitchHz: 1_000 };

    expect(outOfReach(plainReceiver({ bfo }), 457_000)).toBeNull();
    expect(outOfReach(plainReceiver({ bfo }), 452_999)).toMatch(/beat oscillator/);
  });

  it('refuses an oscillator at zero', () => {
    const receiver = plainReceiver({
      ifHz: 540_000,
      bands: [plainBand({ oscillator: 'below', name: 'B' })],
    });

    expect(outOfReach(receiver, 549_999)).toBeNull();
    expect(outOfReach(receiver, 550_000)).toMatch(/band B/);
  });
});
