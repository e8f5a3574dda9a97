import type {
  ReceiverVerdicts,
  VerdictFigures,
} from '../../../../shared/contracts/edition-verdicts';
import { whole } from '../../charts/readings';
import { formatFrequency } from '../../ui/frequency-pipe';
import { kindWords } from './difference-words';

const named = ({ name, frequencyHz }: { name: string; frequencyHz: number }): string =>
  $localize`${name || '–'}:station: on ${formatFrequency(frequencyHz)}:frequency:`;

/** A verdict in one or two sentences: counts, the worst of them, the empty dial. */
export function verdictSentence({ usable, harmed, worst, emptyDial }: VerdictFigures): string {
  const parts = [counted(usable, harmed)];
  if (worst) {
    parts.push(
      worst.ratioDb < 0
        ? $localize`Worst is ${named(worst)}:station:, ${whole(-worst.ratioDb)}:ratio: dB below what disturbs it.`
        : $localize`Worst is ${named(worst)}:station:, ${whole(worst.ratioDb)}:ratio: dB above what disturbs it.`,
    );
  }
  parts.push(
    emptyDial
      ? $localize`On an empty dial ${named(emptyDial)}:station: is heard at ${formatFrequency(emptyDial.dialHz)}:dial:, ${whole(emptyDial.overNoiseDb)}:level: dB over the noise.`
      : $localize`An empty dial is silent but for the noise.`,
  );
  return parts.join(' ');
}

function counted(usable: number, harmed: number): string {
  if (usable === 0) return $localize`No listed station stands clear of the noise.`;
  if (harmed === 0) {
    return $localize`${usable}:count: stations are heard well, and the set harms none of them.`;
  }
  return $localize`${usable}:count: stations are heard well; the set harms ${harmed}:harmed: of them.`;
}

/** Which differing station has a part in it. */
export function causeSentence(cause: ReceiverVerdicts['causes'][number]): string {
  const kinds = cause.kinds.map((kind) => kindWords(kind).toLowerCase()).join(', ');
  const dial = formatFrequency(cause.dialHz);
  const who = `${named(cause)} (${kinds})`;
  if (cause.edition === 'before') {
    return $localize`${who}:station: was heard at ${dial}:dial: before.`;
  }
  if (cause.ratioDb === null) {
    return $localize`${who}:station: is heard on an empty dial at ${dial}:dial:.`;
  }
  return cause.ratioDb < 0
    ? $localize`${who}:station: is heard at ${dial}:dial:, ${whole(-cause.ratioDb)}:ratio: dB over the station wanted there.`
    : $localize`${who}:station: is heard at ${dial}:dial:, ${whole(cause.ratioDb)}:ratio: dB under the station wanted there.`;
}
