import { receiverDraft } from '../../../../shared/contracts/receiver';
import { applyChanges, changesBetween } from './changes';

const circuits = () => [{ qLow: 80, qHigh: 80 }];
const band = { oscillator: 'above', circuits: circuits() } as const;
const saved = receiverDraft.parse({
  name: 'Bench set',
  ifHz: 455_000,
  selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
  bands: [
    { ...band, name: 'Long wave', lowHz: 150_000, highHz: 280_000 },
    { ...band, name: 'Medium wave', lowHz: 520_000, highHz: 1_600_000, circuits: circuits() },
  ],
});

describe('the changes between two receivers', () => {
  it('are none between equal ones', () => {
    expect(changesBetween(saved, structuredClone(saved))).toEqual({});
  });

  it('are as few as can be, and make the one from the other', () => {
    const trial = structuredClone(saved);
    Object.assign(trial.bands[1]?.circuits[0] ?? {}, { qLow: 120 });
    trial.bfo = { centreHz: 455_000, rangeHz: 3000, pitchHz: 800 };

    const changes = changesBetween(saved, trial);

    expect(changes).toEqual({ bfo: trial.bfo, 'bands.1.circuits.0.qLow': 120 });
    expect(applyChanges(saved, changes)).toEqual(trial);
  });

  it('take a list of another length as a whole', () => {
    const trial = structuredClone(saved);
    trial.bands[0]?.circuits.push({ qLow: 50, qHigh: 60 });

    expect(Object.keys(changesBetween(saved, trial))).toEqual(['bands.0.circuits']);
  });

  it('that lead nowhere change nothing', () => {
    expect(applyChanges(saved, { 'bands.7.lowHz': 1, 'trap.q': 9, '__proto__.x': 1 })).toEqual(
      saved,
    );
  });
});
