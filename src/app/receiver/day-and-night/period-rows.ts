import type { Candidate } from '../../../../shared/contracts/candidates';
import { gradeWord } from '../../charts/band-strip/grade-word';
import { change, tenths, whole } from '../../charts/readings';
import { formatFrequency } from '../../ui/frequency-pipe';

type Judged = NonNullable<Candidate['day']>;
type Kind = 'breakthrough' | 'image' | 'products';

/** A figure and what it is about. */
export interface PeriodCell {
  readonly figure: string;
  readonly about: string;
}

/** One term by day and by night. */
export interface PeriodRow {
  readonly term: string;
  readonly day: PeriodCell;
  readonly night: PeriodCell;
}

const NONE: PeriodCell = { figure: $localize`none heard`, about: '' };

/** How a candidate fares by day and by night, term by term. */
export function periodRows(
  candidate: Pick<Candidate, 'day' | 'night'>,
  nameOf: ((station: number) => string) | null,
): PeriodRow[] {
  const { day, night } = candidate;
  const row = (term: string, cell: (judged: Judged | undefined) => PeriodCell): PeriodRow => ({
    term,
    day: cell(day),
    night: cell(night),
  });
  return [
    row($localize`Breakthrough against now`, changeCell),
    row($localize`Worst breakthrough`, (judged) => worstCell(judged, 'breakthrough', nameOf)),
    row($localize`Worst image`, (judged) => worstCell(judged, 'image', nameOf)),
    row($localize`Worst other product`, (judged) => worstCell(judged, 'products', nameOf)),
  ];
}

function changeCell(judged: Judged | undefined): PeriodCell {
  const { breakthroughChangeDb = null, changeSigmaDb = null } = judged ?? {};
  if (breakthroughChangeDb === null) return NONE;
  const about = changeSigmaDb === null ? '' : $localize`±${whole(changeSigmaDb)}:sigma: dB`;
  return { figure: change(breakthroughChangeDb), about };
}

function worstCell(
  judged: Judged | undefined,
  kind: Kind,
  nameOf: ((station: number) => string) | null,
): PeriodCell {
  const worst = judged?.[kind];
  const worstRatioDb = worst?.worstRatioDb ?? null;
  if (!worst || worstRatioDb === null) return NONE;
  const { grade, dialHz, station } = worst;
  const place = dialHz === null ? '' : $localize`at ${formatFrequency(dialHz)}:dial:`;
  const name = station === null || !nameOf ? '' : nameOf(station);
  const figure = $localize`${tenths(worstRatioDb)}:ratio: dB`;
  const about = [
    grade === null ? '' : gradeWord({ grade, hidden: null }),
    [name, place].filter(Boolean).join(' '),
  ];
  return { figure, about: about.filter(Boolean).join(', ') };
}
