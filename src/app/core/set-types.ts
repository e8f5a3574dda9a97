import { receiverDraft, type ReceiverDraft } from '../../../shared/contracts/receiver';
import data from '../../../datasets/set-types.json';

/** A kind of receiver and what such sets are usually like. */
export type SetType = (typeof data.setTypes)[number];

type Circuits = ReceiverDraft['bands'][number]['circuits'];

/** The kinds of receiver one can begin from. */
export const setTypes: readonly SetType[] = data.setTypes;

/** A whole receiver of a type, for somebody who knows nothing else about the set yet. */
export function typicalReceiver(type: SetType): ReceiverDraft {
  const { ifHz, b6Hz, b60Hz, strayDb, signalToOscillatorDb, loop, bands } = type;
  return receiverDraft.parse({
    ifHz,
    selectivity: { kind: 'widths', b6Hz, b60Hz },
    strayDb,
    signalToOscillatorDb,
    aerial: loop ? { kind: 'loop' } : null,
    bands,
  });
}

/** Circuits a band of a type usually has: at higher frequencies the loaded Q falls. */
export function typicalCircuits(type: SetType, lowHz: number, highHz: number): Circuits {
  return type.circuits.map(({ qLow, qHigh }) => ({
    qLow: Math.min(qLow, highestQ(lowHz)),
    qHigh: Math.min(qHigh, highestQ(highHz)),
  }));
}

function highestQ(hz: number): number {
  const { points } = data.qAtHighFrequencies;
  const after = points.findIndex(({ frequencyHz }) => frequencyHz >= hz);
  if (after === 0) return Infinity;
  const [from, to] =
    after < 0 ? [points.at(-1), points.at(-1)] : [points[after - 1], points[after]];
  if (from === undefined || to === undefined) return Infinity;
  const share =
    from === to ? 0 : Math.log(hz / from.frequencyHz) / Math.log(to.frequencyHz / from.frequencyHz);
  return Math.round(from.q + share * (to.q - from.q));
}
