import { receiverDraft } from '../../../../../shared/contracts/receiver';
import { ifSelectivity } from '../../../../../shared/radio/circuits/selectivity';
import { formatFrequency } from '../../../ui/frequency-pipe';
import { type SelectivityFields, selectivityOf } from '../receiver-form/selectivity-controls';

const { selectivity: contract } = receiverDraft.shape;

/** What the fields come to, as the engine takes them; null while they are incomplete. */
export function widthsInWords(fields: SelectivityFields, ifHz: number | null): string | null {
  const { data } = contract.safeParse(selectivityOf(fields));
  if (data === undefined) return null;
  if (data.kind === 'widths') {
    return $localize`Shape factor ${(data.b60Hz / data.b6Hz).toFixed(2)}:factor:`;
  }
  if (ifHz === null) return null;
  try {
    const { b6Hz, b60Hz } = ifSelectivity(data, ifHz);
    const [narrow, wide] = [b6Hz, b60Hz].map((hz) => formatFrequency(Math.round(hz)));
    return $localize`${narrow}:b6: wide at −6 dB, ${wide}:b60: at −60 dB; shape factor ${(b60Hz / b6Hz).toFixed(2)}:factor:`;
  } catch {
    // A curve that the engine cannot follow: the contract says why when it is sent.
    return null;
  }
}
