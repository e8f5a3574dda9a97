import type { Assessment } from '../../../shared/contracts/assessment';
import type { Candidate, CandidatesAnswer } from '../../../shared/contracts/candidates';
import { nearestChannel, defaultRaster } from '../../../shared/radio/channels/raster';
import type { Period } from '../../../shared/radio/site';
import { kilohertz, whole } from '../charts/readings';
import { formatFrequency } from '../ui/frequency-pipe';
import type { Trial } from './trial';

/** A gain smaller than this is none: the numbers do not know better. */
const LEAST_GAIN_DB = 1;
const NEAR_HZ = 12_000;

/** The first candidate that cores and trimmers reach, if it is better than the present IF. */
export function betterIf({ present, candidates }: CandidatesAnswer): number | null {
  const best = candidates.find(({ reachable }) => reachable.ok);
  if (best === undefined || best.ifHz === present.ifHz) return null;
  return present.deficitDb - best.deficitDb < LEAST_GAIN_DB ? null : best.ifHz;
}

/** Where the IF should go, and why, in two sentences. */
export function adviceWords(answer: CandidatesAnswer, { ifHz, ituRegion, period }: Trial): string {
  const here = surroundings(ifHz, nearestChannel(defaultRaster(ituRegion), ifHz));
  const to = betterIf(answer);
  const best = answer.candidates.find((each) => each.ifHz === to);
  if (best === undefined) {
    return $localize`${here}:here: Leave it there: no IF within reach of cores and trimmers is better.`;
  }
  const gain = gainWords(answer.present, best, period);
  return $localize`${here}:here: Set it to ${kilohertz(best.ifHz)}:best: kHz: ${gain}:gain:. Oscillator and dial must follow.`;
}

const TERMS = ['breakthrough', 'image', 'products'] as const;

/** What becomes of that which harms most with the present IF. */
function gainWords(present: Candidate, best: Candidate, period: Period): string {
  const [now, then] = [present[period], best[period]];
  if (!now || !then) return $localize`less is heard that does not belong there`;
  const most = TERMS.reduce((a, b) => (now[b].deficitDb > now[a].deficitDb ? b : a));
  const words = {
    breakthrough: $localize`stations on or near the IF`,
    image: $localize`the images`,
    products: $localize`whistles and other products`,
  }[most];
  const [before, after] = [now[most].worstRatioDb, then[most].worstRatioDb];
  if (before !== null && after === null) return $localize`${words}:what: are then gone`;
  const gain = before === null || after === null ? 0 : after - before;
  return gain >= LEAST_GAIN_DB
    ? $localize`${words}:what: then lie ${whole(gain)}:gain: dB lower at their worst`
    : $localize`${words}:what: then harm less of what could be heard well`;
}

function surroundings(ifHz: number, channel: number | null): string {
  const at = formatFrequency(ifHz);
  const away = channel === null ? Infinity : Math.abs(ifHz - channel);
  if (away === 0) return $localize`An IF of ${at}:frequency: sits on a channel here.`;
  return away <= NEAR_HZ
    ? $localize`An IF of ${at}:frequency: is ${kilohertz(away)}:distance: kHz from a channel here.`
    : $localize`An IF of ${at}:frequency: is clear of the channels here.`;
}

/** What is heard with the IF on trial. */
export function verdictWords({ verdict }: Assessment, period: Period): string {
  const { usable, harmed, emptyDial } = verdict;
  const when = period === 'day' ? $localize`By day` : $localize`By night`;
  const counted = $localize`${when}:period: the set harms ${harmed.length}:harmed: of ${usable}:usable: stations that could be heard well.`;
  if (emptyDial === null) return counted;
  return $localize`${counted}:verdict: On an empty dial the loudest thing that does not belong there is at ${kilohertz(emptyDial.dialHz)}:dial: kHz, ${whole(emptyDial.overNoiseDb)}:level: dB over the noise.`;
}
