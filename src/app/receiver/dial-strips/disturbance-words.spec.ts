import { type StationAtSite } from '../../charts/choice-chart/choice-layout';
import { disturbanceSentence } from './disturbance-words';

const station = (name: string, frequencyHz: number, fieldDb: number | null) =>
  ({ name, frequencyHz, fieldDb }) as StationAtSite;
const range = { low: 1_005_000, high: 2_055_000 };

describe('what the oscillator may disturb', () => {
  it('counts stations in its range that are heard well, and names the strongest', () => {
    const stations = [
      station('Alder', 1_005_000, 60),
      station('Birch', 1_500_000, 70),
      station('below the range', 1_000_000, 90),
      station('too weak', 1_600_000, 41.9),
      station('not known', 1_700_000, null),
    ];

    expect(disturbanceSentence(range, stations, () => 16)).toBe(
      'The oscillator runs on 1005\u00a0kHz to 2055\u00a0kHz and radiates there. Near by it may whistle on 2 stations that are heard well here, of which Birch on 1500\u00a0kHz is the strongest.',
    );
  });

  it('says that none lies there', () => {
    expect(disturbanceSentence(range, [], () => 16)).toContain('No station that is heard well');
  });
});
