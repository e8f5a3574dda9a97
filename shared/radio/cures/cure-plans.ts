/**
 * The changes to a receiver that are tried as cures.
 *
 * Source: common practice.
 *
 * @module radio/cures/cure-plans
 */
import type { SetUp } from './cure-bench.ts';
import type { CureTrap } from './cure-trap.ts';
import type { Band, Receiver } from '../receiver.ts';

/** Kinds of cure, in the order in which they are answered. */
export const CURE_KINDS = [
  'move-if',
  'trap',
  'move-if-and-trap',
  'other-side',
  'one-more-circuit',
  'screening',
] as const;
export type CureKind = (typeof CURE_KINDS)[number];

/** A change, before it is judged. */
export interface CurePlan {
  readonly kind: CureKind;
  readonly name: string;
  readonly setUp: SetUp;
  readonly parts: readonly string[];
  readonly reversible: boolean;
  readonly trap?: CureTrap;
}

/** Q of a circuit added to a band that has none; common practice for medium wave. */
const USUAL_Q = 80;

/**
 * The IF moved by the cores and trimmers that are there.
 *
 * @param receiver The receiver.
 * @param ifHz The new IF, hertz.
 * @returns The plan.
 * @example
 *   movePlan(receiver, 554_500).name; // 'Move the IF to 554.5 kHz'
 */
export function movePlan(receiver: Receiver, ifHz: number): CurePlan {
  const name = `Move the IF to ${khz(ifHz)}`;
  return { kind: 'move-if', name, setUp: { receiver, ifHz }, parts: [], reversible: true };
}

/**
 * A trap at the aerial terminal, in place of one that is there; with the IF moved or not.
 *
 * @param receiver The receiver.
 * @param ifHz The IF, hertz.
 * @param trap The trap.
 * @returns The plan.
 * @example
 *   const offender = { hz: 560e3, levelDb: 50, leastDb: -Infinity };
 *   const trap = bestTrap([offender], 600e3, { q: 100, sourceOhms: 400, loadOhms: 1000 });
 *   trapPlan(receiver, 554_500, trap).kind; // 'move-if-and-trap'
 */
export function trapPlan(receiver: Receiver, ifHz: number, trap: CureTrap): CurePlan {
  const moved = ifHz !== receiver.ifHz;
  const place = trap.trap.kind === 'parallel' ? 'in the aerial lead' : 'across the aerial input';
  const trapName = `rap for ${khz(Math.round(trap.frequencyHz / 100) * 100)} ${place}`;
  return {
    kind: moved ? 'move-if-and-trap' : 'trap',
    name: moved ? `Move the IF to ${khz(ifHz)}, and a t${trapName}` : `T${trapName}`,
    setUp: { receiver: { ...receiver, trap: trap.trap }, ifHz },
    parts: trapParts(trap),
    reversible: true,
    trap,
  };
}

/**
 * The oscillator on the other side of the signal, on each band by itself where it can run there.
 *
 * @param receiver The receiver.
 * @returns A plan for each band on which it can.
 * @example
 *   otherSidePlans(receiver).length; // 1
 */
export function otherSidePlans(receiver: Receiver): CurePlan[] {
  const { ifHz, bands } = receiver;
  return bands.flatMap((band): CurePlan[] => {
    const oscillator = band.oscillator === 'above' ? 'below' : 'above';
    if (oscillator === 'below' && band.lowHz <= ifHz) return [];
    const changed = bands.map((each): Band => (each === band ? { ...band, oscillator } : each));
    return [
      {
        kind: 'other-side',
        name: `Oscillator ${oscillator} the signal on ${band.name}`,
        setUp: { receiver: { ...receiver, bands: changed }, ifHz },
        parts: ['Oscillator coil, trimmer and padder for the new range'],
        reversible: false,
      },
    ];
  });
}

/**
 * One more tuned circuit on every band, as good as the last of those that are there.
 *
 * @param receiver The receiver.
 * @returns The plan.
 * @example
 *   oneMoreCircuitPlan(receiver).setUp.receiver.bands[0]?.circuits.length; // 3
 */
export function oneMoreCircuitPlan(receiver: Receiver): CurePlan {
  const more = (band: Band): Band => {
    const circuit = band.circuits.at(-1) ?? { qLow: USUAL_Q, qHigh: USUAL_Q };
    return { ...band, circuits: [...band.circuits, circuit] };
  };
  return {
    kind: 'one-more-circuit',
    name: 'One more tuned circuit on every band',
    setUp: { receiver: { ...receiver, bands: receiver.bands.map(more) }, ifHz: receiver.ifHz },
    parts: ['A further gang section', 'Coil and trimmer for each band', 'Amplifier or coupling'],
    reversible: false,
  };
}

/**
 * Nothing gets past the tuned circuits any more.
 *
 * @param receiver The receiver.
 * @returns The plan.
 * @example
 *   screeningPlan(receiver).setUp.receiver.strayDb; // null
 */
export function screeningPlan(receiver: Receiver): CurePlan {
  return {
    kind: 'screening',
    name: 'Screen against stray pick-up',
    setUp: { receiver: { ...receiver, strayDb: null }, ifHz: receiver.ifHz },
    parts: ['Screening cans and plates', 'Screened aerial lead', 'Mains filter'],
    reversible: true,
  };
}

function trapParts({ coilH, trap, pairs }: CureTrap): string[] {
  const { E12, E24 } = pairs;
  return [
    `Coil of ${microhenries(coilH)} uH with a core, set to ${microhenries(E12.inductanceH)} uH, ` +
      `Q ${trap.q} or more`,
    `Capacitor of ${picofarads(E12.capacitanceF)} pF (E12), or of ` +
      `${picofarads(E24.capacitanceF)} pF (E24) with ${microhenries(E24.inductanceH)} uH`,
  ];
}

function khz(hz: number): string {
  return `${hz / 1000} kHz`;
}

function microhenries(henries: number): string {
  return String(Number((henries * 1e6).toPrecision(3)));
}

function picofarads(farads: number): string {
  return String(Number((farads * 1e12).toPrecision(3)));
}
