import { FormArray, FormControl, FormGroup } from '@angular/forms';

import type {
  ImportColumn,
  ImportField,
  ImportMatching,
  ImportProposal,
  ImportUnit,
  LetterO,
} from '../../../../shared/contracts/list-import';
import { importUnitsOf } from '../../../../shared/contracts/list-import';

/** Controls of one column: what it holds and in which unit. */
export function columnForm({ header, field, unit }: ImportColumn) {
  return new FormGroup({
    header: new FormControl(header, { nonNullable: true }),
    field: new FormControl<ImportField | null>(field),
    unit: new FormControl<ImportUnit | null>(unit),
  });
}

export type ColumnForm = ReturnType<typeof columnForm>;

type Proposed = Pick<ImportProposal, 'columns' | 'letterO' | 'completes' | 'addsTo'>;

/**
 * Controls of the matching: one group a column in the order of the file, what the letter O means,
 * and the edition that the rows are added to. Mended rows complete their edition unless one objects.
 */
export function matchingForm({ columns, letterO, completes, addsTo }: Proposed) {
  return new FormGroup({
    columns: new FormArray<ColumnForm>(columns.map(columnForm)),
    letterO: new FormControl<LetterO>(letterO === 'open' ? null : letterO),
    addsTo: new FormControl<number | null>(addsTo ?? completes?.editionId ?? null),
  });
}

export type MatchingForm = ReturnType<typeof matchingForm>;

/** Units the column can be given in, by what it is said to hold. */
export function unitsOf({ controls }: ColumnForm): readonly ImportUnit[] {
  const field = controls.field.value;
  return field === null ? [] : importUnitsOf[field];
}

/** The columns of the aerial's pattern: one question for all. */
export const patternOf = (columns: readonly ColumnForm[]): readonly ColumnForm[] =>
  columns.filter(({ controls }) => controls.field.value === 'pattern');

/** What is sent: a unit left over from another field is not. */
export function matchingOf(form: MatchingForm): ImportMatching {
  const { letterO, addsTo } = form.getRawValue();
  const columns = form.controls.columns.controls.map((column) => {
    const { header, field, unit } = column.getRawValue();
    const isFitting = unit !== null && unitsOf(column).includes(unit);
    return { header, field, unit: isFitting ? unit : null };
  });
  return { columns, addsTo, ...(letterO === 'east' || letterO === 'west' ? { letterO } : {}) };
}
