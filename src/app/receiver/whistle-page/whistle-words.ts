import type { WhistlesAnswer } from '../../../../shared/contracts/whistles';
import { CAUTION } from '../../../../shared/radio/caution';
import type { CauseMark } from '../../charts/cause-mark';
import { beatCause, beatMark, beatOrigin, pitchWords, strengthWords } from '../pointer/beat-words';

/** A cause that a whistle may have, in words. */
export interface WhistleWords {
  readonly look: CauseMark | undefined;
  readonly cause: string;
  readonly name: string;
  readonly origin: string;
  readonly pitch: string;
  readonly slope: string;
  readonly strength: string;
  /** The test at the bench, without the caution that stands once on the page. */
  readonly test: string;
}

/** The causes in words, the most likely first. */
export const whistleCauses = (
  causes: WhistlesAnswer['causes'],
  nameOf: (station: number) => string,
): WhistleWords[] =>
  causes.map((each) => ({
    look: beatMark(each),
    cause: beatCause(each),
    name: each.name,
    origin: beatOrigin(each, nameOf),
    pitch: pitchWords(each),
    slope: slopeWords(each.slope),
    strength: strengthWords(each),
    test: each.test.replace(CAUTION, '').trim(),
  }));

/** How the pitch moves with the dial. */
export function slopeWords(slope: number): string {
  if (slope === 0) return $localize`stays when the dial is moved`;
  return $localize`moves ${Number(slope.toFixed(2))}:slope: Hz a hertz of dial`;
}
