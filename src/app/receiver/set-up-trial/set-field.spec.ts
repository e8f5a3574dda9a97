import { receiverDraft } from '../../../../shared/contracts/receiver';
import { fieldText, setField } from './set-field';
import { type TrialField, trialGroups } from './trial-fields';

const saved = receiverDraft.parse({
  name: 'Bench set',
  ifHz: 455_000,
  selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
  bands: [{ name: 'Medium wave', lowHz: 520_000, highHz: 1_600_000, oscillator: 'above' }],
});

const fields = trialGroups(saved).flatMap((group) => group.fields);
const field = (path: string): TrialField => {
  const found = fields.find((each) => each.path === path);
  if (!found) throw new Error(`No field ${path}: ${fields.map((each) => each.path).join()}`);
  return found;
};
const set = (path: string, typed: string) => {
  const changed = setField(saved, field(path), typed);
  if ('problem' in changed) throw new Error(changed.problem);
  return changed.receiver;
};

describe('a field on trial', () => {
  it('is every field but name, IF and tracking', () => {
    expect(fields.map(({ path }) => path)).toEqual(
      expect.arrayContaining([
        'aerial',
        'trap',
        'strayDb.image',
        'bands.0.lowHz',
        'bands.0.oscillator',
        'bands.0.circuits',
        'bands.0.circuits.0.qLow',
        'selectivity.b6Hz',
        'bfo',
        'audioCornerHz',
      ]),
    );
  });

  it('is read as it would be in the set-up', () => {
    expect(set('bands.0.highHz', '1,7 MHz').bands[0]?.highHz).toBe(1_700_000);
    expect(set('strayDb.if', '80 dB').strayDb?.if).toBe(80);
    expect(set('bands.0.oscillator', 'below').bands[0]?.oscillator).toBe('below');
    expect(set('audioCornerHz', '').audioCornerHz).toBeNull();
  });

  it('can be a part that is fitted or taken out', () => {
    const trap = set('trap', 'fitted').trap;
    expect(trap?.kind).toBe('parallel');
    const resonance =
      1 / (2 * Math.PI * Math.sqrt((trap?.inductanceH ?? 0) * (trap?.capacitanceF ?? 0)));
    expect(resonance).toBeCloseTo(455_000, 0);
    expect(set('strayDb', 'none').strayDb).toBeNull();
    expect(set('bands.0.circuits', '3').bands[0]?.circuits).toHaveLength(3);
  });

  it('that makes a set nobody could build is refused in words', () => {
    expect(setField(saved, field('bands.0.circuits.0.qLow'), 'much')).toHaveProperty('problem');
    expect(setField(saved, field('selectivity.b60Hz'), '1 kHz')).toEqual({
      problem: 'The width at -60 dB must be larger than the width at -6 dB.',
    });
  });

  it('stands in its field as it would be typed', () => {
    expect(fieldText(saved, field('bands.0.lowHz'))).toBe('520');
    expect(fieldText(saved, field('trap'))).toBe('none');
    expect(fieldText(saved, field('bands.0.circuits'))).toBe('1');
  });
});
