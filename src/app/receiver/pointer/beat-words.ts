import type { WhistlesAnswer } from '../../../../shared/contracts/whistles';
import { type CauseMark, causeMarks } from '../../charts/cause-mark';
import { field, tenths, whole } from '../../charts/readings';
import { formatFrequency } from '../../ui/frequency-pipe';

export type Beat = WhistlesAnswer['causes'][number];
type NameOf = (station: number) => string;

const ownWords: Partial<Record<Beat['cause'], string>> = {
  'adjacent-carrier': $localize`station beside the wanted one`,
  'if-harmonic': $localize`harmonic of the IF`,
  'bfo-harmonic': $localize`harmonic of the beat oscillator`,
  'second-oscillator': $localize`second oscillator`,
};

/** The mark of the cause, where it is one that the strips draw. */
export const beatMark = ({ cause }: Beat): CauseMark | undefined =>
  causeMarks.find((each) => each.cause === cause);

/** The cause in words. */
export const beatCause = (beat: Beat): string =>
  beatMark(beat)?.label ?? ownWords[beat.cause] ?? beat.name;

/** The station or the pair behind it; the set itself where there is none. */
export function beatOrigin({ station, secondStation, frequencyHz }: Beat, nameOf: NameOf): string {
  if (station === null) return $localize`the set itself, on ${formatFrequency(frequencyHz)}:from:`;
  const first = nameOf(station);
  if (secondStation !== undefined) {
    return $localize`${first}:station: with ${nameOf(secondStation)}:other:`;
  }
  return $localize`${first}:station: on ${formatFrequency(frequencyHz)}:from:`;
}

/** A pitch as it is heard. */
export function pitchWords({ pitchHz }: Pick<Beat, 'pitchHz'>): string {
  if (pitchHz === 0) return $localize`zero beat`;
  if (pitchHz < 40) return $localize`a flutter of ${pitchHz}:pitch: Hz`;
  return $localize`${pitchHz}:pitch: Hz`;
}

/** How strong a tone is beside a fully modulated programme: an own estimate of the words. */
export function strengthWords({ levelDb }: Pick<Beat, 'levelDb'>): string {
  if (levelDb === null) return $localize`level not known`;
  const beside = $localize`${tenths(levelDb)}:level: dB to the programme`;
  if (levelDb >= -6) return $localize`as loud as the programme, ${beside}:level:`;
  if (levelDb >= -26) return $localize`plain, ${beside}:level:`;
  if (levelDb >= -40) return $localize`soft, ${beside}:level:`;
  return $localize`faint, ${beside}:level:`;
}

/** What is listened to at the dial setting, and how much beats with it, in words. */
export function pointerSentence(
  { wanted, noiseDb, causes }: WhistlesAnswer,
  dialHz: number,
  nameOf: NameOf,
): string {
  const at = formatFrequency(dialHz);
  const over = whole(wanted.fieldDb - noiseDb);
  const heard =
    wanted.station === null
      ? $localize`At ${at}:dial: no station strong enough is listed; a wanted field of ${field(wanted.fieldDb)}:field: is assumed.`
      : $localize`At ${at}:dial: the set hears ${nameOf(wanted.station)}:station:, ${over}:level: dB over the noise.`;
  const loudest = causes.find(({ levelDb }) => levelDb !== null);
  if (!loudest) return $localize`${heard}:heard: Nothing of known level beats with it.`;
  return $localize`${heard}:heard: Strongest beside it: ${beatOrigin(loudest, nameOf)}:origin: (${beatCause(loudest)}:cause:), ${pitchWords(loudest)}:pitch:, ${strengthWords(loudest)}:strength:.`;
}
