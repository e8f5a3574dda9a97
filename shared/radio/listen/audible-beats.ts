/**
 * Beats as tones that can be played beside the set on the bench.
 *
 * Source: pitch and level as in `whistles`; what an ear hears is common practice, the limits are an
 * own estimate.
 *
 * @module radio/listen/audible-beats
 */

/** A beat at a dial setting. */
export interface Beat {
  /** Hertz. */
  readonly pitchHz: number;
  /** Relative to any one level common to all, decibels; null: not known. */
  readonly levelDb: number | null;
}

/** A tone of a beat: a sine of this amplitude. */
export interface Tone {
  /** Place of the beat among those given. */
  readonly beat: number;
  readonly pitchHz: number;
  /** Share of full scale; all tones together never exceed `FULL`. */
  readonly amplitude: number;
}

/** A small loudspeaker gives nothing below, an ear little above; hertz. */
export const LOWEST_TONE_HZ = 40;
export const HIGHEST_TONE_HZ = 12_000;
/** All tones together: soft, whatever the number of beats. */
export const FULL = 0.25;
/** A tone so far under the loudest is not heard beside it. */
const MASKED_DB = 40;
const MOST_TONES = 6;

/**
 * Turns beats into tones: the loudest at the level that all tones together leave, the others as far
 * under it as they are on the set.
 *
 *     a_i = FULL * 10^(L_i / 20) / sum 10^(L_j / 20)
 *
 * A beat whose level is not known cannot be compared: it is played only when it is alone or with
 * others of its kind, all alike. Beats below 40 Hz or above 12 kHz, those 40 dB under the loudest,
 * and all but the six loudest are not played. Of beats with one pitch the loudest is played.
 *
 * @param beats The beats.
 * @returns Their tones, the loudest first.
 *
 * @example
 *   audibleBeats([{ pitchHz: 1000, levelDb: -12 }])[0]?.amplitude; // 0.25
 */
export function audibleBeats(beats: readonly Beat[]): Tone[] {
  const heard = beats
    .map((beat, at) => ({ ...beat, beat: at }))
    .filter(({ pitchHz }) => pitchHz >= LOWEST_TONE_HZ && pitchHz <= HIGHEST_TONE_HZ);
  const known = heard.filter(({ levelDb }) => levelDb !== null);
  const played = (known.length > 0 ? known : heard)
    .map(({ beat, pitchHz, levelDb }) => ({ beat, pitchHz, levelDb: levelDb ?? 0 }))
    .sort((a, b) => b.levelDb - a.levelDb);
  const loudest = played[0]?.levelDb ?? 0;
  const distinct = played.filter(
    ({ pitchHz, levelDb }, at) =>
      levelDb >= loudest - MASKED_DB && played.findIndex((each) => each.pitchHz === pitchHz) === at,
  );
  const tones = distinct
    .slice(0, MOST_TONES)
    .map(({ beat, pitchHz, levelDb }) => ({ beat, pitchHz, share: shareOf(levelDb - loudest) }));
  const sum = tones.reduce((total, { share }) => total + share, 0);
  return tones.map(({ beat, pitchHz, share }) => ({
    beat,
    pitchHz,
    amplitude: (FULL * share) / sum,
  }));
}

const shareOf = (db: number): number => 10 ** (db / 20);
