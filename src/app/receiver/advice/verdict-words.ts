import type { Assessment } from '../../../../shared/contracts/assessment';
import type { Period } from '../../../../shared/radio/site';
import { whole } from '../../charts/readings';
import { formatFrequency } from '../../ui/frequency-pipe';

type Verdict = Assessment['verdict'];

/** The verdict on the IF on trial in words: counts, and what changes against the set as it is. */
export function verdictSentences(
  verdict: Verdict,
  present: Verdict | undefined,
  period: Period,
  nameOf: (station: number) => string,
): string[] {
  return [counted(verdict, period), compared(verdict, present), empty(verdict, nameOf)].filter(
    (each) => each !== '',
  );
}

function counted({ usable, harmed }: Verdict, period: Period): string {
  const when = period === 'day' ? $localize`By day` : $localize`By night`;
  if (usable === 0)
    return $localize`${when}:period: no listed station of these bands stands clear of the noise.`;
  if (harmed.length === 0) {
    return $localize`${when}:period: ${usable}:count: stations are heard well, and the set harms none of them.`;
  }
  return $localize`${when}:period: ${usable}:count: stations are heard well; the set harms ${harmed.length}:harmed: of them.`;
}

function compared(verdict: Verdict, present: Verdict | undefined): string {
  if (!present) return '';
  const fewer = present.harmed.length - verdict.harmed.length;
  const less = present.deficitDb - verdict.deficitDb;
  if (fewer > 0) return $localize`That is ${fewer}:count: fewer than now.`;
  if (fewer < 0) return $localize`That is ${-fewer}:count: more than now.`;
  if (Math.abs(less) < 1) return $localize`That is as it is now.`;
  return less > 0
    ? $localize`As many as now, but ${whole(less)}:level: dB less is missing.`
    : $localize`As many as now, but ${whole(-less)}:level: dB more is missing.`;
}

function empty({ emptyDial }: Verdict, nameOf: (station: number) => string): string {
  if (!emptyDial) return $localize`An empty dial is silent but for the noise.`;
  const { station, dialHz, overNoiseDb } = emptyDial;
  return $localize`On an empty dial ${nameOf(station)}:station: is heard at ${formatFrequency(dialHz)}:dial:, ${whole(overNoiseDb)}:level: dB over the noise.`;
}
