import type { ReceiverInput } from '../../shared/contracts/receiver.ts';

/** A receiver as somebody would send it: little more than what must be given. */
export const sentReceiver = (change: Partial<ReceiverInput> = {}): ReceiverInput => ({
  name: 'Table set',
  ifHz: 455_000,
  selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
  bands: [{ name: 'Medium wave', lowHz: 550_000, highHz: 1_600_000, oscillator: 'above' }],
  ...change,
});
