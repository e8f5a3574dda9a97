import type { Cure } from '../../../../shared/contracts/cures';
import { change, whole } from '../../charts/readings';
import { formatFrequency } from '../../ui/frequency-pipe';

type Gain = Cure['gainDb'][number];

/** Gains smaller than this are none. */
export const LEAST_GAIN_DB = 1;
/** Losses smaller than this are not heard. */
const LEAST_COST_DB = 0.1;

export const gainOf = ({ deficitBeforeDb, deficitAfterDb }: Cure): number =>
  deficitBeforeDb - deficitAfterDb;

/** The cures, what helps most first; of those that help alike what costs least, and can be undone. */
export const bestFirst = (cures: readonly Cure[]): Cure[] =>
  [...cures].sort(
    (a, b) =>
      Math.round(a.deficitAfterDb) - Math.round(b.deficitAfterDb) ||
      Number(b.reversible) - Number(a.reversible) ||
      a.parts.length - b.parts.length ||
      a.costDb - b.costDb,
  );

/** What a cure costs at the lowest wanted channel. */
export const costText = ({ costDb }: Cure): string =>
  Math.abs(costDb) < LEAST_COST_DB ? $localize`none` : $localize`${change(-costDb)}:level:`;

/** What would cure it, and what that costs, in a sentence. */
export function curesSentence(cures: readonly Cure[]): string {
  const [best] = bestFirst(cures);
  if (!best) return $localize`Nothing is known that would help.`;
  if (best.deficitBeforeDb < LEAST_GAIN_DB)
    return $localize`The set harms no station as it is: nothing needs a cure.`;
  if (gainOf(best) < LEAST_GAIN_DB) return $localize`None of these changes much.`;
  const left = $localize`${whole(best.deficitBeforeDb)}:before: dB left to be desired become ${whole(best.deficitAfterDb)}:after:`;
  return $localize`Most is gained by this: ${best.name}:cure:. ${left}:left:; ${outlay(best)}:outlay:.`;
}

function outlay({ costDb, parts, reversible }: Cure): string {
  const cost =
    costDb < LEAST_COST_DB
      ? $localize`it costs no signal`
      : $localize`it costs ${whole(Math.max(1, costDb))}:level: dB at the lowest wanted station`;
  const needs = parts.length === 0 ? $localize`needs no parts` : $localize`needs parts`;
  const undone = reversible ? $localize`and can be undone` : $localize`and cannot be undone`;
  return $localize`${cost}:cost:, ${needs}:parts: ${undone}:undone:`;
}

/** One of the worst cases before and after a cure, in words. */
export function gainWords(
  { period, station, dialHz, beforeDb, afterDb, gainDb }: Gain,
  nameOf: (station: number) => string,
): { readonly where: string; readonly what: string } {
  const when = period === 'day' ? $localize`by day` : $localize`by night`;
  const where = $localize`${nameOf(station)}:station: at ${formatFrequency(dialHz)}:dial:, ${when}:when:`;
  const gone = $localize`no longer heard (was ${whole(beforeDb)}:before: dB)`;
  if (afterDb === null || gainDb === null) return { where, what: gone };
  return {
    where,
    what: $localize`${change(gainDb)}:gain: (${whole(beforeDb)}:before: to ${whole(afterDb)}:after:)`,
  };
}
