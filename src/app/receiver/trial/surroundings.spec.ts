import { receiverDraft } from '../../../../shared/contracts/receiver';
import { defaultRaster } from '../../../../shared/radio/channels/raster';
import { noiseAt, passband, rasterOn, shownAround } from './surroundings';

const receiver = receiverDraft.parse({
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 9000, b60Hz: 30_000 },
  bands: [{ name: 'MW', lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' }],
});

describe('the surroundings of the IF', () => {
  it('show every candidate and the IF on trial', () => {
    const { low, high } = shownAround(receiver, 640_000);

    expect(low).toBeLessThan(527_000);
    expect(high).toBeGreaterThan(640_000);
  });

  it('mark the channels and the middle third between two of them', () => {
    const { channels, guards } = rasterOn(defaultRaster(2), { low: 548_000, high: 572_000 });

    expect(channels).toEqual([550_000, 560_000, 570_000]);
    expect(guards.map(({ low, high }) => [Math.round(low), Math.round(high)])).toEqual([
      [553_333, 556_667],
      [563_333, 566_667],
    ]);
  });

  it('take passband and noise from the engine', () => {
    const site = {
      latitude: null,
      longitude: null,
      ground: null,
      noise: 'city',
      indoors: false,
      noiseFloorDb: null,
      ituRegion: 1,
    } as const;

    expect(passband(receiver, 560_000)(4500)).toBeCloseTo(6, 6);
    // ITU-R P.372, city, 1 MHz in 9 kHz: 20.84 dB(µV/m).
    expect(noiseAt(site, receiver)(1_000_000)).toBeCloseTo(20.84, 2);
  });
});
