import { type StationAtSite } from '../../charts/choice-chart/choice-layout';
import { formatFrequency } from '../../ui/frequency-pipe';

/** As in a verdict: a station so far over the noise is listened to. */
const USABLE_DB = 26;

/** On what the set's own oscillator radiates, and whom it may disturb there. */
export function disturbanceSentence(
  { low, high }: { readonly low: number; readonly high: number },
  stations: readonly StationAtSite[],
  noise: (hz: number) => number | null,
): string {
  const range = $localize`The oscillator runs on ${formatFrequency(low)}:low: to ${formatFrequency(high)}:high: and radiates there.`;
  const heard = stations
    .filter(
      (each): each is StationAtSite & { fieldDb: number } =>
        each.frequencyHz >= low &&
        each.frequencyHz <= high &&
        each.fieldDb !== null &&
        each.fieldDb >= (noise(each.frequencyHz) ?? Infinity) + USABLE_DB,
    )
    .sort((a, b) => b.fieldDb - a.fieldDb);
  const [strongest] = heard;
  if (!strongest) return $localize`${range}:range: No station that is heard well here lies on it.`;
  return $localize`${range}:range: Near by it may whistle on ${heard.length}:count: stations that are heard well here, of which ${strongest.name}:station: on ${formatFrequency(strongest.frequencyHz)}:frequency: is the strongest.`;
}
