import { receiverDraft } from '../../../../shared/contracts/receiver';
import { rejectionCharts } from './rejection-curves';

const receiver = receiverDraft.parse({
  ifHz: 455_000,
  selectivity: { kind: 'widths', b6Hz: 8000, b60Hz: 45_000 },
  strayDb: null,
  bands: [
    {
      name: 'Medium wave',
      lowHz: 550_000,
      highHz: 1_400_000,
      oscillator: 'above',
      circuits: [{ qLow: 50, qHigh: 50 }],
    },
  ],
});

describe('curves of rejection', () => {
  it('are two charts a band, with the set as it is', () => {
    const charts = rejectionCharts(receiver, []);

    expect(charts.map(({ heading }) => heading)).toEqual([
      'Image rejection, Medium wave',
      'IF rejection, Medium wave',
    ]);
    // C: IF 455, one circuit Q 50, dial 550.
    expect(charts[1]?.sentence).toBe('Least: as it is, 25.6 dB at 550 kHz.');
    expect(charts[1]?.curves[0]?.points).toHaveLength(41);
  });

  it('add a curve for each change that is chosen and can be made', () => {
    const [image] = rejectionCharts(receiver, ['one-more-circuit', 'no-stray']);

    expect(image?.curves.map(({ name }) => name)).toEqual(['as it is', 'one more circuit']);
    expect(image?.sentence).toContain('one more circuit, ');
  });
});
