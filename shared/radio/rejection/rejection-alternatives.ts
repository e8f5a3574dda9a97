/**
 * Image and IF rejection along a band: as the set is, and as it would be after a change.
 *
 * Source: circuits and traps as in `circuits`; which changes are looked at is common practice.
 *
 * @module radio/rejection/rejection-alternatives
 */
import { type RejectionPoint, rejectionCurve } from '../assessment/rejection-curve.ts';
import { FrontEnd } from '../circuits/front-end.ts';
import { bestTrap, type TrapEnds } from '../cures/cure-trap.ts';
import { oneMoreCircuitPlan, otherSidePlans } from '../cures/cure-plans.ts';
import type { Band, Receiver } from '../receiver.ts';

/** What is changed about the set. */
export type RejectionChange =
  'as-it-is' | 'one-more-circuit' | 'higher-q' | 'other-side' | 'trap' | 'no-stray';

/** The set after a change. */
export interface RejectionAlternative {
  readonly change: RejectionChange;
  readonly receiver: Receiver;
  /** Rejection along the band, from the low end up. */
  readonly points: readonly RejectionPoint[];
}

/** A good coil in place of a poor one; an own estimate of what rewinding brings. */
export const HIGHER_Q = 1.5;
/** Common practice where nothing is known of the trap. */
const USUAL_ENDS: TrapEnds = { q: 100, sourceOhms: 400, loadOhms: 1000 };

/**
 * The rejection of a band under every change that can be made: one more tuned circuit as good as the
 * last, every Q half as high again, the oscillator on the other side, the best trap for the IF, no
 * stray pick-up. Each is the rejection an assessment of the changed receiver answers.
 *
 * A change that cannot be made is left out: an oscillator below needs a band above the IF, a Q needs
 * a circuit, and stray pick-up that has no limit cannot be stopped.
 *
 * @param receiver The receiver.
 * @param at Place of the band among its bands.
 * @returns The set as it is, then after each change.
 * @throws {RangeError} If there is no such band, or a value of the receiver is out of range.
 *
 * @example
 *   rejectionAlternatives(receiver, 0).length; // 5
 */
export function rejectionAlternatives(receiver: Receiver, at: number): RejectionAlternative[] {
  const band = receiver.bands[at];
  if (band === undefined) throw new RangeError(`at: there is no band ${at}`);
  const changed: [RejectionChange, Receiver | null][] = [
    ['as-it-is', receiver],
    ['one-more-circuit', oneMoreCircuitPlan(receiver).setUp.receiver],
    ['higher-q', withHigherQ(receiver)],
    ['other-side', onOtherSide(receiver, at)],
    ['trap', withTrap(receiver, band)],
    ['no-stray', receiver.strayDb === null ? null : { ...receiver, strayDb: null }],
  ];
  return changed.flatMap(([change, set]) =>
    set === null ? [] : [{ change, receiver: set, points: pointsOf(set, at) }],
  );
}

function pointsOf(receiver: Receiver, at: number): RejectionPoint[] {
  const band = receiver.bands[at];
  return band === undefined ? [] : rejectionCurve(receiver, new FrontEnd(receiver, band), band);
}

function withHigherQ(receiver: Receiver): Receiver | null {
  if (receiver.bands.every(({ circuits }) => circuits.length === 0)) return null;
  const raised = (band: Band): Band => ({
    ...band,
    circuits: band.circuits.map(({ qLow, qHigh }) => ({
      qLow: qLow * HIGHER_Q,
      qHigh: qHigh * HIGHER_Q,
    })),
  });
  return { ...receiver, bands: receiver.bands.map(raised) };
}

function onOtherSide(receiver: Receiver, at: number): Receiver | null {
  const plan = otherSidePlans(receiver).find(
    ({ setUp }) => setUp.receiver.bands[at] !== receiver.bands[at],
  );
  return plan?.setUp.receiver ?? null;
}

/** In place of a trap that is there. */
function withTrap(receiver: Receiver, { lowHz }: Band): Receiver | null {
  const offender = { hz: receiver.ifHz, levelDb: 0, leastDb: -Infinity };
  const found = bestTrap([offender], lowHz, receiver.trap ?? USUAL_ENDS);
  return found && { ...receiver, trap: found.trap };
}
