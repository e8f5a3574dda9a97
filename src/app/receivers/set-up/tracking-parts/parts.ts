import type * as z from 'zod';

import type { trackingAnswer } from '../../../../../shared/contracts/tracking';
import { formatFrequency } from '../../../ui/frequency-pipe';
import { formatQuantity, quantities } from '../../../ui/quantity/quantity';

/** A part, or a figure, by name. */
export interface Part {
  readonly name: string;
  readonly value: string;
}

/** What a design comes to, in the order in which it is wound and set. */
export function partsOf(
  design: z.output<typeof trackingAnswer>,
  oscillator: 'above' | 'below',
): Part[] {
  const { signalCoilH, signalTrimmerF, oscillatorCoilH, padderF, oscillatorTrimmerF } = design;
  const { pointsHz, worstErrorHz } = design;
  const padder =
    oscillator === 'above'
      ? $localize`Padder, in the oscillator`
      : $localize`Padder, in the signal circuit`;
  return [
    { name: $localize`Signal coil`, value: inUnit(signalCoilH, 'inductance') },
    { name: $localize`Signal trimmer with stray`, value: inUnit(signalTrimmerF, 'capacitance') },
    { name: $localize`Oscillator coil`, value: inUnit(oscillatorCoilH, 'inductance') },
    { name: padder, value: inUnit(padderF, 'capacitance') },
    { name: $localize`Oscillator trimmer`, value: inUnit(oscillatorTrimmerF, 'capacitance') },
    { name: $localize`Points`, value: pointsHz.map((hz) => formatFrequency(hz)).join(', ') },
    { name: $localize`Worst error`, value: errorWords(worstErrorHz) },
  ];
}

/** Three figures: nobody winds a coil or sets a trimmer closer than that. */
function inUnit(value: number | null, quantity: 'capacitance' | 'inductance'): string {
  if (value === null) return '–';
  const shown = formatQuantity(Number(value.toPrecision(3)), quantity);
  return `${shown}\u00a0${quantities[quantity].unit}`;
}

const errorWords = (hz: number | null): string =>
  hz === null ? '–' : `±${formatFrequency(Math.round(Math.abs(hz)))}`;
