import { receiverDraft } from '../../../../shared/contracts/receiver';
import { bandsToRealign, lossLeftAlone } from './bands-to-realign';

const receiver = receiverDraft.parse({
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 3000, b60Hz: 12_000 },
  bands: [
    { name: 'MW', lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' },
    { name: 'SW', lowHz: 6_000_000, highHz: 18_000_000, oscillator: 'above' },
  ],
});

describe('the bands to realign', () => {
  it('are those whose circuits would stand off by more than a decibel', () => {
    expect(bandsToRealign(receiver, -5000)).toEqual({ realign: ['MW'], leave: ['SW'] });
  });

  it('lose 3 dB where the shift is half the bandwidth of the circuit', () => {
    const [band] = receiver.bands;

    // Half-power points of a circuit lie f/2Q from its middle: any text on tuned circuits.
    expect(band && lossLeftAlone(band, 600_000 / 160)).toBeCloseTo(3.01, 2);
  });

  it('are all of them when the shift is great', () => {
    expect(bandsToRealign(receiver, 60_000).leave).toEqual([]);
  });
});
