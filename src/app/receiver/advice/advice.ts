import type { Candidate, CandidatesAnswer } from '../../../../shared/contracts/candidates';
import type { Receiver } from '../../../../shared/radio/receiver';
import type { Period } from '../../../../shared/radio/site';
import type { StationAtSite } from '../../charts/choice-chart/choice-layout';
import { kilohertz, whole } from '../../charts/readings';
import { passband } from '../trial/surroundings';
import { bandsToRealign } from './bands-to-realign';

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
  /** At how many sites one IF is to serve; left out: one. */
  readonly sites?: number;
}

/** A gain smaller than this is none: it is smaller than what the numbers know. */
const LEAST_GAIN_DB = 1;

/** An IF that takes less than this off from midway between two channels does not part them. */
const NARROW_DB = 15;

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
  if (best.ifHz === present.ifHz || gain < LEAST_GAIN_DB) return stay(present, whyStay(grounds));
  return { kind: 'move', text: moveText(grounds, best, gain), ifHz: best.ifHz };
}

function stay({ ifHz }: Candidate, reason: string): Advice {
  const text = $localize`Leave it where it is, on ${kilohertz(ifHz)}:frequency: kHz: ${reason}:reason:`;
  return { kind: 'stay', text, ifHz };
}

function whyStay({ answer, receiver, channels }: AdviceGrounds): string {
  const { deficitDb } = answer.present;
  if (deficitDb < LEAST_GAIN_DB) return $localize`the set harms no station from there.`;
  const broad = broadness(receiver, channels);
  return broad === null
    ? $localize`no IF within reach leaves ${LEAST_GAIN_DB}:gain: dB less to be desired.`
    : $localize`the set is too broad to gain anything by moving: midway between two channels its IF takes only ${whole(broad)}:level: dB off them.`;
}

/** What the IF takes off two channels from midway between them, where that is little; else null. */
function broadness(receiver: Receiver, channels: readonly number[]): number | null {
  const steps = channels.flatMap((hz, at) => (at === 0 ? [] : hz - (channels[at - 1] ?? hz)));
  if (steps.length === 0) return null;
  const taken = passband(receiver, receiver.ifHz)(Math.min(...steps) / 2);
  return taken < NARROW_DB ? taken : null;
}

function moveText(grounds: AdviceGrounds, best: Candidate, gain: number): string {
  const sentences = [
    reasonToMove(grounds),
    $localize`Set it to ${target(best)}:target:: ${gainText(grounds, best, gain)}:gain:; ${afterwards(grounds.receiver, best.ifHz)}:afterwards:.`,
    (grounds.sites ?? 1) > 1
      ? $localize`Of all IFs it is the best where it is worst, over ${grounds.sites}:count: sites.`
      : '',
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

/** What else must follow the IF, and what need not. */
function afterwards(receiver: Receiver, ifHz: number): string {
  const { realign, leave } = bandsToRealign(receiver, ifHz - receiver.ifHz);
  const oscillators =
    leave.length === 0
      ? $localize`realign the oscillator of each band`
      : $localize`realign the oscillator on ${listed(realign)}:bands:`;
  return [
    ...(receiver.bfo ? [$localize`retune the BFO`] : []),
    ...(realign.length > 0 ? [oscillators] : []),
    ...(leave.length > 0 ? [$localize`leave ${listed(leave)}:bands: alone`] : []),
  ].join(leave.length > 0 ? '; ' : $localize` and `);
}

const listed = (names: readonly string[]): string =>
  new Intl.ListFormat('en-GB', { type: 'conjunction' }).format(names);
