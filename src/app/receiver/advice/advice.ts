import type { Candidate, CandidatesAnswer } from '../../../../shared/contracts/candidates';
import type { Receiver } from '../../../../shared/radio/receiver';
import type { Period } from '../../../../shared/radio/site';
import type { StationAtSite } from '../../charts/choice-chart/choice-layout';
import { kilohertz, whole } from '../../charts/readings';

/** What to do about the IF, in words made from the numbers. */
export interface Advice {
  readonly kind: 'move' | 'stay' | 'nothing-heard';
  readonly text: string;
  /** Where the IF should be, hertz. */
  readonly ifHz: number;
}

/** What the advice is made from. */
export interface AdviceGrounds {
  readonly answer: CandidatesAnswer;
  readonly receiver: Receiver;
  readonly stations: readonly StationAtSite[];
  /** Channels of the raster around the IF, hertz. */
  readonly channels: readonly number[];
  readonly period: Period;
}

/** A gain smaller than this is none: it is smaller than what the numbers know. */
const LEAST_GAIN_DB = 1;

const byPeriod = (period: Period): string =>
  period === 'day' ? $localize`by day` : $localize`by night`;

/** Chooses between moving and staying, and says why. */
export function advise(grounds: AdviceGrounds): Advice {
  const { answer, stations, period } = grounds;
  const { present } = answer;
  const best = answer.candidates.find(({ reachable }) => reachable.ok);
  if (!stations.some(({ fieldDb }) => fieldDb !== null)) {
    const text = $localize`No station is in reach ${byPeriod(period)}:period:: nothing here decides between one IF and another.`;
    return { kind: 'nothing-heard', text, ifHz: present.ifHz };
  }
  if (!best) return stay(present, $localize`no other IF is within reach.`);
  const gain = present.deficitDb - best.deficitDb;
  if (best.ifHz === present.ifHz || gain < LEAST_GAIN_DB) return stay(present, whyStay(present));
  return { kind: 'move', text: moveText(grounds, best, gain), ifHz: best.ifHz };
}

function stay({ ifHz }: Candidate, reason: string): Advice {
  const text = $localize`Leave it where it is, on ${kilohertz(ifHz)}:frequency: kHz: ${reason}:reason:`;
  return { kind: 'stay', text, ifHz };
}

function whyStay({ deficitDb }: Candidate): string {
  return deficitDb < LEAST_GAIN_DB
    ? $localize`the set harms no station from there.`
    : $localize`no IF within reach leaves ${LEAST_GAIN_DB}:gain: dB less to be desired.`;
}

function moveText(grounds: AdviceGrounds, best: Candidate, gain: number): string {
  const sentences = [
    reasonToMove(grounds),
    $localize`Set it to ${target(best)}:target:: ${gainText(grounds, best, gain)}:gain:; ${afterwards(grounds.receiver)}:afterwards:.`,
  ];
  return sentences.filter((each) => each !== '').join(' ');
}

/** What stands on or beside the present IF. */
function reasonToMove({ answer, stations, channels }: AdviceGrounds): string {
  const { ifHz } = answer.present;
  const here = kilohertz(ifHz);
  if (channels.includes(ifHz)) return $localize`${here}:frequency: is on a channel here.`;
  const nearest = stations
    .filter(({ fieldDb }) => fieldDb !== null)
    .sort((a, b) => Math.abs(a.frequencyHz - ifHz) - Math.abs(b.frequencyHz - ifHz))[0];
  if (!nearest || Math.abs(nearest.frequencyHz - ifHz) > 10_000) return '';
  const away = kilohertz(Math.abs(nearest.frequencyHz - ifHz));
  return nearest.frequencyHz === ifHz
    ? $localize`${nearest.name}:station: is on ${here}:frequency: itself.`
    : $localize`${nearest.name}:station: is ${away}:distance: kHz from ${here}:frequency:.`;
}

function target({ ifHz, windowHz }: Candidate): string {
  const here = kilohertz(ifHz);
  if (!windowHz) return $localize`${here}:frequency: kHz`;
  const [below, above] = [ifHz - windowHz.low, windowHz.high - ifHz];
  const round = (hz: number) => kilohertz(Math.floor(hz / 100) * 100);
  return Math.abs(below - above) <= 200
    ? $localize`${here}:frequency: ± ${round(Math.min(below, above))}:tolerance: kHz`
    : $localize`${here}:frequency: kHz (breakthrough stays within 3 dB from ${round(windowHz.low)}:low: to ${round(windowHz.high)}:high:)`;
}

function gainText({ period }: AdviceGrounds, best: Candidate, gain: number): string {
  const judged = best[period];
  const change = judged?.breakthroughChangeDb ?? null;
  if (!judged || change === null || change > -LEAST_GAIN_DB) {
    return $localize`${whole(gain)}:gain: dB less is left to be desired over all`;
  }
  const sigma = judged.changeSigmaDb;
  const lessText = $localize`about ${whole(-change)}:change: dB less breakthrough ${byPeriod(period)}:period: than now`;
  return sigma === null ? lessText : $localize`${lessText}:change: (±${whole(sigma)}:sigma:)`;
}

/** What else must follow the IF. */
const afterwards = ({ bfo }: Receiver): string =>
  bfo
    ? $localize`retune the BFO and realign the oscillator of each band`
    : $localize`realign the oscillator of each band`;
