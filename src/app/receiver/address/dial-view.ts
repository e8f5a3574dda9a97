import type { ParamMap, Params } from '@angular/router';

import { cause, grade } from '../../../../shared/contracts/assessment';
import type { Cause } from '../../charts/cause-mark';
import type { JudgedResponse } from '../../charts/band-strip/strip-layout';

export type GradeName = NonNullable<JudgedResponse['grade']>;

/** What of the dial is shown: everything that its address can say. */
export interface DialView {
  readonly isLog: boolean;
  /** None: all. */
  readonly causes: readonly Cause[];
  /** None: all. */
  readonly grades: readonly GradeName[];
  /** Part of a station's name; empty: all. */
  readonly station: string;
  readonly isHiddenShown: boolean;
  /** Response picked, by the id of its mark. */
  readonly picked: string | null;
  /** Response whose working is open. */
  readonly working: string | null;
}

const listed = <T extends string>(text: string | null, known: readonly T[]): T[] => {
  const said = text?.split(',') ?? [];
  return known.filter((each) => said.includes(each));
};

/** Reads an address; what makes no sense counts as not said. */
export function readDialView(params: ParamMap): DialView {
  return {
    isLog: params.get('scale') !== 'linear',
    causes: listed(params.get('cause'), cause.options),
    grades: listed(params.get('grade'), grade.options),
    station: params.get('station') ?? '',
    isHiddenShown: params.get('hidden') !== 'left-out',
    picked: params.get('mark'),
    working: params.get('working'),
  };
}

/** Query parameters that say a change; null takes one out of the address. */
export function dialParams(change: Partial<DialView>): Params {
  const { isLog, causes, grades, station, isHiddenShown, picked, working } = change;
  return {
    ...(isLog === undefined ? {} : { scale: isLog ? null : 'linear' }),
    ...(causes === undefined ? {} : { cause: causes.join(',') || null }),
    ...(grades === undefined ? {} : { grade: grades.join(',') || null }),
    ...(station === undefined ? {} : { station: station || null }),
    ...(isHiddenShown === undefined ? {} : { hidden: isHiddenShown ? null : 'left-out' }),
    ...(picked === undefined ? {} : { mark: picked }),
    ...(working === undefined ? {} : { working }),
  };
}
