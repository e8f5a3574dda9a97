import { type AbstractControl, FormArray, FormGroup } from '@angular/forms';

import type { ReceiverDraft } from '../../../../../shared/contracts/receiver';
import { held, neededWhile } from './held';

type Selectivity = ReceiverDraft['selectivity'];
export type SelectivityKind = Selectivity['kind'];

const neededOf = (kind: SelectivityKind, message: string, value: number | null = null) =>
  held<number | null>(
    value,
    neededWhile((group) => group?.get('kind')?.value === kind, message),
  );

/** A row lies in the list of rows of the selectivity. */
const isOfTable = (row: AbstractControl | null): boolean =>
  row?.parent?.parent?.get('kind')?.value === 'table';

export const pointControls = (offsetHz: number | null = null, rejectionDb: number | null = null) =>
  new FormGroup({
    offsetHz: held(
      offsetHz,
      neededWhile(isOfTable, $localize`Give the distance from the middle, for example 4.5 kHz.`),
    ),
    rejectionDb: held(
      rejectionDb,
      neededWhile(isOfTable, $localize`Give how far the response is down there, in dB.`),
    ),
  });
export type PointControls = ReturnType<typeof pointControls>;

/** The IF amplifier's selectivity; what is typed of each kind stays while another is shown. */
export const selectivityControls = () =>
  new FormGroup({
    kind: held<SelectivityKind>('widths'),
    b6Hz: neededOf('widths', $localize`Give the width at −6 dB, for example 6 kHz.`),
    b60Hz: neededOf('widths', $localize`Give the width at −60 dB, for example 22 kHz.`),
    count: neededOf('transformers', $localize`Give the number of IF transformers, as a rule 2.`, 2),
    q: neededOf('transformers', $localize`Give the loaded Q of each winding, for example 60.`),
    coupling: neededOf('transformers', $localize`Give the coupling, 1 for critical.`, 1),
    points: new FormArray<PointControls>([pointControls(0, 0), pointControls()]),
  });
export type SelectivityControls = ReturnType<typeof selectivityControls>;
export type SelectivityFields = ReturnType<SelectivityControls['getRawValue']>;

/** What the fields of the chosen kind say. */
export function selectivityOf({ kind, ...fields }: SelectivityFields): object {
  const { b6Hz, b60Hz, count, q, coupling, points } = fields;
  if (kind === 'widths') return { kind, b6Hz, b60Hz };
  return kind === 'transformers' ? { kind, count, q, coupling } : { kind, points };
}

/** A selectivity as its fields show it. */
export const selectivityFieldsOf = (
  selectivity: Selectivity,
): Parameters<SelectivityControls['patchValue']>[0] =>
  selectivity.kind === 'table'
    ? { ...selectivity, points: selectivity.points.map((point) => ({ ...point })) }
    : selectivity;
