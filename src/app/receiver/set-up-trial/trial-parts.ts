import type { ReceiverDraft } from '../../../../shared/contracts/receiver';

/** Kinds a part of the set can be of; "none" where it can be left out. */
export const partKinds = {
  selectivity: ['widths', 'transformers'],
  strayDb: ['none', 'fitted'],
  fixedFilter: ['none', 'fitted'],
  bfo: ['none', 'fitted'],
  trap: ['none', 'fitted'],
  aerial: ['none', 'primary', 'loop'],
  secondConversion: ['none', 'fitted'],
} as const;

export type PartName = keyof typeof partKinds;

export const isPart = (path: string): path is PartName => Object.hasOwn(partKinds, path);

/** Of which kind a part is now. */
export function kindOf(receiver: ReceiverDraft, part: PartName): string {
  const found = receiver[part];
  if (found === null) return 'none';
  return part === 'selectivity' || part === 'aerial' ? (found as { kind: string }).kind : 'fitted';
}

const TRAP_COIL_H = 200e-6;

/** A part of a kind with values to begin from; the trap is tuned to the IF. */
export function partOf(receiver: ReceiverDraft, part: PartName, kind: string): unknown {
  if (kind === 'none') return null;
  const { ifHz } = receiver;
  const capacitanceF = 1 / ((2 * Math.PI * ifHz) ** 2 * TRAP_COIL_H);
  const ends = { sourceOhms: 400, loadOhms: 400 };
  const lowest = Math.min(...receiver.bands.map(({ lowHz }) => lowHz));
  const beginnings: Record<PartName, unknown> = {
    selectivity:
      kind === 'transformers'
        ? { kind, count: 2, q: 60, coupling: 1 }
        : { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
    strayDb: { if: 60, image: 60 },
    fixedFilter: { kind: 'ceramic', centreHz: ifHz, widthHz: 6000 },
    bfo: { centreHz: ifHz, rangeHz: 3000, pitchHz: 800 },
    trap: { kind: 'parallel', inductanceH: TRAP_COIL_H, capacitanceF, q: 100, ...ends },
    aerial: kind === 'loop' ? { kind } : { kind, resonanceHz: Math.round(0.8 * lowest), q: 10 },
    secondConversion: { ifHz: ifHz > 1_000_000 ? 455_000 : 85_000, oscillator: 'above' },
  };
  return beginnings[part];
}
