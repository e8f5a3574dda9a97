import { setTypes, typicalCircuits, typicalReceiver } from './set-types';

const [domestic] = setTypes;
if (!domestic) throw new Error('There are no types of set.');

describe('the types of set', () => {
  it.each(setTypes)('"$name" makes a whole receiver', (type) => {
    expect(typicalReceiver(type).bands).toHaveLength(type.bands.length);
  });

  it.each(setTypes)('"$name" has the circuits of its own bands', (type) => {
    for (const { lowHz, highHz, circuits } of type.bands) {
      const typical = typicalCircuits(type, lowHz, highHz);

      typical.forEach(({ qLow, qHigh }, at) => {
        expect(Math.abs(qLow - (circuits[at]?.qLow ?? 0))).toBeLessThanOrEqual(20);
        expect(Math.abs(qHigh - (circuits[at]?.qHigh ?? 0))).toBeLessThanOrEqual(20);
      });
    }
  });

  it('keep their Q below 3 MHz and lose it above', () => {
    const [low] = typicalCircuits(domestic, 520_000, 1_610_000);
    const [high] = typicalCircuits(domestic, 12_000_000, 30_000_000);

    expect(low).toEqual({ qLow: 55, qHigh: 55 });
    expect(high).toEqual({ qLow: 55, qHigh: 40 });
  });
});
