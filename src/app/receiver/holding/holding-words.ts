import type { Candidate } from '../../../../shared/contracts/candidates';
import { kilohertz, percent, tenths } from '../../charts/readings';

/** What the person at the bench must keep, hertz and as a fraction of the IF; null: no window. */
export function toleranceOf({ ifHz, windowHz }: Pick<Candidate, 'ifHz' | 'windowHz'>) {
  if (!windowHz) return null;
  const hz = Math.max(0, Math.min(ifHz - windowHz.low, windowHz.high - ifHz));
  return { hz, permille: (1000 * hz) / ifHz };
}

/** In which window the choice holds, and what generator, counter and drift must keep for it. */
export function holdingSentence(candidate: Pick<Candidate, 'ifHz' | 'windowHz'>): string {
  const { ifHz, windowHz } = candidate;
  const kept = toleranceOf(candidate);
  if (!windowHz || !kept) {
    return $localize`No breakthrough is heard with the IF at ${kilohertz(ifHz)}:frequency: kHz or near it: it need not be kept closely.`;
  }
  const [low, high] = [kilohertz(windowHz.low), kilohertz(windowHz.high)];
  const window = $localize`The choice holds from ${low}:low: to ${high}:high: kHz: there breakthrough stays within 3 dB.`;
  if (kept.hz === 0)
    return $localize`${window}:window: It stands on the edge: a little drift spoils it.`;
  const tolerance = $localize`±${kilohertz(Math.floor(kept.hz / 10) * 10)}:tolerance: kHz, ${tenths(kept.permille)}:permille: parts in a thousand`;
  return $localize`${window}:window: Generator, counter and drift together must keep within ${tolerance}:tolerance:.`;
}

/** What else must move with the IF, each with its figure. */
export function movesWith(candidate: Candidate): { readonly what: string; readonly how: string }[] {
  const { capacitanceChange, bfoShiftHz, trackingCostDb, reachable } = candidate;
  return [
    {
      what: $localize`IF tuning capacitance`,
      how: reachable.ok
        ? percent(capacitanceChange)
        : $localize`${percent(capacitanceChange)}:change:: ${reachable.reason ?? ''}:reason:`,
    },
    ...(bfoShiftHz === null || bfoShiftHz === 0
      ? []
      : [{ what: $localize`BFO`, how: shift(bfoShiftHz) }]),
    ...(trackingCostDb === null
      ? []
      : [
          {
            what: $localize`Tracking costs at most`,
            how: $localize`${tenths(trackingCostDb)}:level: dB`,
          },
        ]),
  ];
}

const shift = (hz: number): string => $localize`${(hz > 0 ? '+' : '') + kilohertz(hz)}:shift: kHz`;
