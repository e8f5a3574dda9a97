import type { Assessment } from '../../../../shared/contracts/assessment';
import { assessHeld, heldStations } from './held-assessment';
import type { HeldList, TrialMessage, TrialReply, TrialQuestion } from './trial-messages';

/** The engine beside the page: it holds one list and judges by it. */
let held:
  { readonly list: HeldList; readonly stations: ReturnType<typeof heldStations> } | undefined;

addEventListener('message', ({ data }: MessageEvent<TrialMessage>) => {
  if (data.kind === 'hold') held = { list: data.list, stations: heldStations(data.list) };
  else postMessage(reply(data.question));
});

function reply(question: TrialQuestion): TrialReply {
  if (!held) return { kind: 'failed', message: 'No list is held.' };
  try {
    const judged = assessHeld(held.list, held.stations, question);
    // What is posted is copied: the copy may be written to, as the contract's type says.
    return { kind: 'judged', assessment: judged as Assessment };
  } catch (error) {
    return { kind: 'failed', message: String(error) };
  }
}
