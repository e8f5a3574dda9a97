import { type CauseMark, causeMark, causeMarks } from '../../charts/cause-mark';
import { gradeWord } from '../../charts/band-strip/grade-word';
import {
  type JudgedBand,
  type JudgedResponse,
  overNoise,
  responseMark,
} from '../../charts/band-strip/strip-layout';
import { kilohertz, tenths } from '../../charts/readings';

/** A response as a row of the table. */
export interface ResponseRow {
  readonly id: string;
  readonly band: string;
  /** The station, or the two that make the product. */
  readonly stations: readonly number[];
  readonly response: JudgedResponse;
  readonly look: CauseMark;
  readonly dial: string;
  readonly overNoise: string;
  readonly ratio: string;
  readonly grade: string;
}

/** The responses of all bands, the worst first; those without a level last. */
export function responseRows(bands: readonly JudgedBand[]): ResponseRow[] {
  return bands
    .flatMap((band) => band.responses.map((response) => row(band.name, response)))
    .sort((a, b) => (a.response.ratioDb ?? Infinity) - (b.response.ratioDb ?? Infinity));
}

function row(band: string, response: JudgedResponse): ResponseRow {
  const over = overNoise(response);
  return {
    id: responseMark(band, response),
    band,
    stations: [response.station, response.secondStation].filter((each) => each !== undefined),
    response,
    look: causeMark(response.cause),
    dial: response.dialHz === null ? $localize`everywhere` : kilohertz(response.dialHz),
    overNoise: over === null ? '\u2013' : tenths(over),
    ratio: response.ratioDb === null ? '\u2013' : tenths(response.ratioDb),
    grade: gradeWord(response),
  };
}

/** The causes that occur, with how often each is heard. */
export const causesHeard = (bands: readonly JudgedBand[]) =>
  causeMarks
    .map((look) => ({
      look,
      count: bands.reduce(
        (sum, { responses }) =>
          sum +
          responses.filter(({ cause, hidden }) => cause === look.cause && hidden === null).length,
        0,
      ),
    }))
    .filter(({ count }) => count > 0);
