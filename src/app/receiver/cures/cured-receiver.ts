import type { Cure } from '../../../../shared/contracts/cures';
import type { ReceiverDraft } from '../../../../shared/contracts/receiver';
import type { Receiver } from '../../../../shared/radio/receiver';
import {
  oneMoreCircuitPlan,
  otherSidePlans,
  screeningPlan,
} from '../../../../shared/radio/cures/cure-plans';

/** A set as a cure leaves it. */
export interface CuredSet {
  /** With its present IF: the IF on trial stands apart. */
  readonly receiver: ReceiverDraft;
  readonly ifHz: number;
}

/** The set that a cure of the answer makes; the answer names kinds, the engine's plans change sets. */
export function curedSet(receiver: ReceiverDraft, cure: Cure, cures: readonly Cure[]): CuredSet {
  const changed = changedSet(receiver, cure, cures);
  const trap = cure.trap ? { trap: cure.trap.trap } : {};
  return { receiver: { ...changed, ...trap }, ifHz: cure.ifHz ?? receiver.ifHz };
}

function changedSet(receiver: ReceiverDraft, cure: Cure, cures: readonly Cure[]): ReceiverDraft {
  switch (cure.kind) {
    case 'other-side': {
      // One for each band that allows it, in the order of the bands; names need not differ.
      const place = cures.filter(({ kind }) => kind === 'other-side').indexOf(cure);
      return withBandsOf(receiver, otherSidePlans(receiver)[place]?.setUp.receiver);
    }
    case 'one-more-circuit':
      return withBandsOf(receiver, oneMoreCircuitPlan(receiver).setUp.receiver);
    case 'screening':
      return { ...receiver, strayDb: screeningPlan(receiver).setUp.receiver.strayDb };
    default:
      return receiver;
  }
}

/** Takes over what a plan changes of the bands: side and circuits. */
function withBandsOf(receiver: ReceiverDraft, planned: Receiver | undefined): ReceiverDraft {
  const bands = receiver.bands.map((band, at) => {
    const { oscillator = band.oscillator, circuits = band.circuits } = planned?.bands[at] ?? {};
    return { ...band, oscillator, circuits: [...circuits] };
  });
  return { ...receiver, bands };
}
