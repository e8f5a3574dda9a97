import { FormArray, FormControl, FormGroup } from '@angular/forms';

import type {
  ImportColumn,
  ImportField,
  ImportMatching,
  ImportUnit,
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

/** Controls of the matching, one group a column in the order of the file. */
export function matchingForm(columns: readonly ImportColumn[]) {
  return new FormGroup({ columns: new FormArray<ColumnForm>(columns.map(columnForm)) });
}

/** Units the column can be given in, by what it is said to hold. */
export function unitsOf({ controls }: ColumnForm): readonly ImportUnit[] {
  const field = controls.field.value;
  return field === null ? [] : importUnitsOf[field];
}

/** What is sent: a unit left over from another field is not. */
export function matchingOf(form: ReturnType<typeof matchingForm>): ImportMatching['columns'] {
  return form.controls.columns.controls.map((column) => {
    const { header, field, unit } = column.getRawValue();
    const isFitting = unit !== null && unitsOf(column).includes(unit);
    return { header, field, unit: isFitting ? unit : null };
  });
}
