import type { AssessmentInput } from '../../../shared/contracts/assessment';
import type { CandidatesInput } from '../../../shared/contracts/candidates';
import type { FieldStrengthsInput } from '../../../shared/contracts/field-strengths';
import type { ReceiverDraft } from '../../../shared/contracts/receiver';
import type { ItuRegion, NoiseClass, Period, Site } from '../../../shared/radio/site';
import { type SetType, typicalReceiver } from '../core/set-types';

/** Field assumed on every channel while there is no list, dB(µV/m): a strong station by day. */
export const ASSUMED_FIELD_DB = 70;

const STEP_HZ = 500;
const MOST_CANDIDATES = 160;

/** What a visitor says about a set and a place. */
export interface Trial {
  readonly type: SetType;
  readonly ifHz: number;
  readonly ituRegion: ItuRegion;
  readonly noise: NoiseClass;
  readonly period: Period;
}

/** A typical set of the type, with the IF that was given. */
export const receiverOf = ({ type, ifHz }: Trial): ReceiverDraft => ({
  ...typicalReceiver(type),
  ifHz,
});

/** A place of which only the ITU Region and the noise are known. */
export const siteOf = ({ ituRegion, noise }: Trial): Site => ({
  latitude: null,
  longitude: null,
  ground: null,
  noise,
  indoors: false,
  noiseFloorDb: null,
  ituRegion,
});

const stations = { everyChannelDb: ASSUMED_FIELD_DB };

/** Which IFs to judge: as far as cores and trimmers reach, in steps of half a kilohertz. */
export function candidatesQuestion(trial: Trial): CandidatesInput {
  const receiver = receiverOf(trial);
  const reachHz = trial.ifHz * receiver.ifRange;
  const stepHz = STEP_HZ * Math.ceil((2 * reachHz) / STEP_HZ / MOST_CANDIDATES);
  return {
    receiver: input(receiver),
    site: siteOf(trial),
    ...stations,
    periods: [trial.period],
    fromHz: Math.max(1000, Math.ceil((trial.ifHz - reachHz) / stepHz) * stepHz),
    toHz: Math.floor((trial.ifHz + reachHz) / stepHz) * stepHz,
    stepHz,
  };
}

/** The set judged with its IF where it is tried. */
export const assessmentQuestion = (trial: Trial, trialHz: number): AssessmentInput => ({
  receiver: { ...input(receiverOf(trial)), ifHz: trialHz },
  site: siteOf(trial),
  ...stations,
  period: trial.period,
});

export const fieldsQuestion = (trial: Trial): FieldStrengthsInput => ({
  site: siteOf(trial),
  ...stations,
  period: trial.period,
});

const input = (receiver: ReceiverDraft): CandidatesInput['receiver'] => ({
  ...receiver,
  bands: receiver.bands.map((band) => ({ ...band, circuits: [...band.circuits] })),
});
