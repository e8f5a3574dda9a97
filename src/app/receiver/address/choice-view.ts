import type { ParamMap, Params } from '@angular/router';

import type { Window } from '../../charts/zoom-window';

/** Column by which the candidates are sorted. */
export interface CandidateSort {
  readonly active: string;
  readonly direction: 'asc' | 'desc';
}

/** What of the choice of IF is shown: everything that its address can say. */
export interface ChoiceView {
  /** Part of the chart in view, hertz; null: all of it. */
  readonly window: Window | null;
  /** Null: as ranked. */
  readonly sort: CandidateSort | null;
  /** Day whose hours are shown, such as 2026-12-21; null: today. */
  readonly date: string | null;
}

const SORT = /^([a-z]+)-(asc|desc)$/;
const WINDOW = /^(\d{1,11})-(\d{1,11})$/;
const DATE = /^(19|20)\d\d-\d\d-\d\d$/;

/** Reads an address; what makes no sense counts as not said. */
export function readChoiceView(params: ParamMap): ChoiceView {
  const [, low, high] = WINDOW.exec(params.get('view') ?? '') ?? [];
  const [, active, direction] = SORT.exec(params.get('sort') ?? '') ?? [];
  const date = params.get('date');
  return {
    window: Number(high) > Number(low) ? [Number(low), Number(high)] : null,
    sort: active ? { active, direction: direction === 'desc' ? 'desc' : 'asc' } : null,
    date: date !== null && isDay(date) ? date : null,
  };
}

const isDay = (text: string): boolean =>
  DATE.test(text) && !Number.isNaN(Date.parse(`${text}T00:00:00Z`));

/** Query parameters that say a change; null takes one out of the address. */
export function choiceParams({ window, sort, date }: Partial<ChoiceView>): Params {
  return {
    ...(window === undefined ? {} : { view: window?.map(Math.round).join('-') ?? null }),
    ...(sort === undefined ? {} : { sort: sort && `${sort.active}-${sort.direction}` }),
    ...(date === undefined ? {} : { date }),
  };
}
