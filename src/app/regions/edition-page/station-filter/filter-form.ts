import { FormControl, FormGroup } from '@angular/forms';

import type { StationQuery } from '../../../../../shared/contracts/station-list';

/** Fields of a station query that a form changes. */
export type Filter = Pick<
  StationQuery,
  'fromHz' | 'toHz' | 'only' | 'site' | 'period' | 'maxDistanceM' | 'minFieldDb' | 'corrections'
>;

/** Controls of the filter; what is empty filters nothing. */
export const filterForm = () =>
  new FormGroup({
    fromHz: new FormControl<number | null>(null),
    toHz: new FormControl<number | null>(null),
    only: new FormControl<NonNullable<Filter['only']> | ''>('', { nonNullable: true }),
    site: new FormControl<number | null>(null),
    period: new FormControl<Filter['period']>('night', { nonNullable: true }),
    maxDistanceM: new FormControl<number | null>(null),
    minFieldDb: new FormControl<number | null>(null),
    corrections: new FormControl<Filter['corrections']>('applied', { nonNullable: true }),
  });

export type FilterForm = ReturnType<typeof filterForm>;

/** Shows a query; a control that shows it already keeps what was typed. */
export function showFilter(form: FilterForm, query: Filter): void {
  for (const [name, control] of Object.entries(form.controls)) {
    const value = query[name as keyof Filter] ?? (name === 'only' ? '' : null);
    if (control.value !== value && control.valid) {
      (control as FormControl<unknown>).setValue(value, { emitEvent: false });
    }
  }
}

/** What the form asks; distance and field need a site. */
export function filterOf(form: FilterForm): { [K in keyof Filter]: Filter[K] | undefined } {
  const typed = form.getRawValue();
  const isAtSite = typed.site !== null;
  return {
    fromHz: typed.fromHz ?? undefined,
    toHz: typed.toHz ?? undefined,
    only: typed.only === '' ? undefined : typed.only,
    site: typed.site ?? undefined,
    period: typed.period,
    maxDistanceM: isAtSite ? (typed.maxDistanceM ?? undefined) : undefined,
    minFieldDb: isAtSite ? (typed.minFieldDb ?? undefined) : undefined,
    corrections: typed.corrections,
  };
}
