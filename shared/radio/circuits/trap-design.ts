/**
 * Parts of a wave trap for a frequency.
 *
 * Source: resonance, and own rule for the choice; losses as in `trapLoss`.
 *
 * @module radio/circuits/trap-design
 */
import { nearestPreferred, type Series } from './preferred-values.ts';
import type { Trap } from '../receiver.ts';
import { trapFrequency, trapLoss } from './trap.ts';

/** What is asked; exactly one of coil and capacitor is given. */
export interface TrapInput {
  readonly frequencyHz: number;
  readonly kind: Trap['kind'];
  readonly inductanceH?: number | undefined;
  readonly capacitanceF?: number | undefined;
  readonly q: number;
  readonly sourceOhms: number;
  readonly loadOhms: number;
  /** Frequencies at which the loss is asked, hertz. */
  readonly atHz: readonly number[];
}

/** A coil and a capacitor. */
export interface TrapParts {
  readonly inductanceH: number;
  readonly capacitanceF: number;
}

/** Parts of which the computed one is a preferred value, and what they resonate at. */
export interface PreferredParts extends TrapParts {
  /** Whole hertz. */
  readonly frequencyHz: number;
}

/** A trap, designed. */
export interface TrapDesign {
  readonly parts: TrapParts;
  readonly preferred: Readonly<Record<Series, PreferredParts>>;
  readonly loss: readonly { readonly frequencyHz: number; readonly db: number }[];
}

/**
 * Finds the missing part of a trap, `L C = 1/(2 pi f)^2`, the preferred values nearest to it, and
 * the loss of the exact trap.
 *
 * @param input Frequency, kind, one part, Q, the resistances on both sides.
 * @returns The parts, the preferred ones with the frequency they give, and the losses.
 * @throws {RangeError} If not exactly one part is given, or a value is not above 0.
 *
 * @example
 *   designTrap({ frequencyHz: 455e3, kind: 'parallel', inductanceH: 500e-6, q: 100,
 *     sourceOhms: 400, loadOhms: 1000, atHz: [455e3] }).loss[0]?.db; // 40.265
 */
export function designTrap(input: TrapInput): TrapDesign {
  const parts = partsOf(input);
  const trap: Trap = { ...input, ...parts };
  return {
    parts,
    preferred: {
      E12: preferredParts(input, parts, 'E12'),
      E24: preferredParts(input, parts, 'E24'),
    },
    loss: input.atHz.map((frequencyHz) => ({ frequencyHz, db: trapLoss(trap, frequencyHz) })),
  };
}

function partsOf({ frequencyHz, inductanceH, capacitanceF }: TrapInput): TrapParts {
  if (!(frequencyHz > 0)) throw new RangeError(`frequencyHz must be above 0, got ${frequencyHz}`);
  if ((inductanceH === undefined) === (capacitanceF === undefined)) {
    throw new RangeError('inductanceH: give either a coil or a capacitor, not both');
  }
  const product = 1 / (2 * Math.PI * frequencyHz) ** 2;
  if (inductanceH !== undefined) {
    if (!(inductanceH > 0)) throw new RangeError(`inductanceH must be above 0, got ${inductanceH}`);
    return { inductanceH, capacitanceF: product / inductanceH };
  }
  const given = capacitanceF ?? NaN;
  if (!(given > 0)) throw new RangeError(`capacitanceF must be above 0, got ${given}`);
  return { inductanceH: product / given, capacitanceF: given };
}

/** The part that was computed is rounded to the series; the given one stays. */
function preferredParts(input: TrapInput, parts: TrapParts, series: Series): PreferredParts {
  const preferred =
    input.inductanceH === undefined
      ? { ...parts, inductanceH: nearestPreferred(parts.inductanceH, series) }
      : { ...parts, capacitanceF: nearestPreferred(parts.capacitanceF, series) };
  return { ...preferred, frequencyHz: Math.round(trapFrequency(preferred)) };
}
