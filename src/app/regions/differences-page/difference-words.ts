import type { Difference, DifferenceKind } from '../../../../shared/contracts/edition-differences';
import type { StationRecord } from '../../../../shared/contracts/station-list';
import { change, distance } from '../../charts/readings';
import { factName, STATION_FACTS, type StationFact, writtenFact } from '../correction-words';

/** What can be asked for, in the order it is shown. */
export const DIFFERENCE_KINDS: readonly DifferenceKind[] = [
  'added',
  'gone',
  'moved',
  'changed-power',
  'changed-frequency',
  'changed-other',
];

export function kindWords(kind: DifferenceKind): string {
  switch (kind) {
    case 'added':
      return $localize`Added`;
    case 'gone':
      return $localize`Gone`;
    case 'moved':
      return $localize`Moved`;
    case 'changed-power':
      return $localize`Changed power`;
    case 'changed-frequency':
      return $localize`Changed frequency`;
    case 'changed-other':
      return $localize`Changed otherwise`;
  }
}

/** One thing that is another than before. */
export interface DifferenceLine {
  readonly name: string;
  readonly before: string;
  readonly after: string;
  /** By how much; empty where that cannot be said. */
  readonly by: string;
}

/** What an added or gone station is said by. */
const SUMMARY: readonly StationFact[] = ['place', 'day', 'night'];

/** What changed, line by line; an added or gone station with what it is. */
export function differenceLines(difference: Difference): DifferenceLine[] {
  const { before, after } = difference;
  if (!before || !after) {
    return SUMMARY.map((fact) => lineOf(fact, before, after)).filter(isSaid);
  }
  const lines = STATION_FACTS.map((fact) => ({
    ...lineOf(fact, before, after),
    by: amount(fact, difference),
  })).filter((line) => line.before !== line.after);
  const isPattern = JSON.stringify(before.patternDb) !== JSON.stringify(after.patternDb);
  return isPattern ? [...lines, patternLine(before, after)] : lines;
}

const lineOf = (
  fact: StationFact,
  before: StationRecord | null,
  after: StationRecord | null,
): DifferenceLine => ({
  name: factName(fact),
  before: before ? (writtenFact(before, fact) ?? '') : '',
  after: after ? (writtenFact(after, fact) ?? '') : '',
  by: '',
});

const isSaid = ({ before, after }: DifferenceLine): boolean =>
  ![before, after].every((text) => text === '' || text === '–');

function amount(fact: StationFact, { movedM, powerDayDb, powerNightDb }: Difference): string {
  if (fact === 'place') return movedM === null ? '' : distance(movedM);
  if (fact === 'day') return powerDayDb === null ? '' : change(powerDayDb);
  if (fact === 'night') return powerNightDb === null ? '' : change(powerNightDb);
  return '';
}

function patternLine(before: StationRecord, after: StationRecord): DifferenceLine {
  const say = ({ patternDb }: StationRecord) =>
    patternDb === null ? $localize`all round` : $localize`directional`;
  return { name: $localize`Pattern`, before: say(before), after: say(after), by: '' };
}
