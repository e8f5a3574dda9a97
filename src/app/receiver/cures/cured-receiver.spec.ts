import type { Cure } from '../../../../shared/contracts/cures';
import { receiverDraft } from '../../../../shared/contracts/receiver';
import { curedSet } from './cured-receiver';

const band = { lowHz: 600_000, highHz: 1_600_000, oscillator: 'above' } as const;
const receiver = receiverDraft.parse({
  ifHz: 560_000,
  selectivity: { kind: 'widths', b6Hz: 3000, b60Hz: 12_000 },
  bands: [
    { ...band, name: 'Range' },
    { ...band, name: 'Range', lowHz: 1_600_000, highHz: 4_000_000 },
  ],
});
const cure = (kind: Cure['kind'], changes: Partial<Cure> = {}): Cure => ({
  kind,
  name: kind,
  gainDb: [],
  deficitBeforeDb: 40,
  deficitAfterDb: 4,
  costDb: 0,
  parts: [],
  reversible: true,
  caution: '',
  ...changes,
});
const trap = {
  kind: 'parallel',
  inductanceH: 250e-6,
  capacitanceF: 323e-12,
  q: 100,
  sourceOhms: 400,
  loadOhms: 1000,
} as const;

describe('the set that a cure makes', () => {
  it('has the IF that the cure moves to, and its trap', () => {
    const pair = { inductanceH: 250e-6, capacitanceF: 330e-12 };
    const both = cure('move-if-and-trap', {
      ifHz: 554_500,
      trap: { frequencyHz: 560_000, coilH: 250e-6, trap, pairs: { E12: pair, E24: pair } },
    });

    expect(curedSet(receiver, both, [both])).toEqual({
      receiver: { ...receiver, trap },
      ifHz: 554_500,
    });
  });

  it('tells bands of one name apart by their place', () => {
    const cures = [cure('screening'), cure('other-side'), cure('other-side')];
    const sides = ([, first, second]: readonly Cure[]) =>
      [first, second].map((each) =>
        curedSet(receiver, each ?? cure('trap'), cures).receiver.bands.map(
          ({ oscillator }) => oscillator,
        ),
      );

    expect(sides(cures)).toEqual([
      ['below', 'above'],
      ['above', 'below'],
    ]);
  });

  it('has one circuit more on every band, or nothing that gets past them', () => {
    const more = cure('one-more-circuit');
    const screened = cure('screening');

    expect(
      curedSet(receiver, more, [more]).receiver.bands.map(({ circuits }) => circuits.length),
    ).toEqual([2, 2]);
    expect(curedSet(receiver, screened, [screened]).receiver.strayDb).toBeNull();
  });
});
