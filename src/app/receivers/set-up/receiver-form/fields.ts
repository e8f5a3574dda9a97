import type { FormArray, FormGroup } from '@angular/forms';
import * as z from 'zod';

import type { ReceiverDraft } from '../../../../../shared/contracts/receiver';
import {
  bandControls,
  circuitControls,
  type ReceiverControls,
  type ReceiverFields,
} from './controls';
import { pointControls, selectivityFieldsOf, selectivityOf } from './selectivity-controls';
import { trackingFieldsOf, trackingOf } from './tracking-controls';

/** What the fields say, as the contract wants it; it may still be incomplete or wrong. */
export function receiverOf(fields: ReceiverFields): unknown {
  const { selectivity, strayDb, fixedFilter, bfo, trap, secondConversion, aerial, ...rest } =
    fields;
  return {
    ...rest,
    bands: rest.bands.map((band) => ({ ...band, tracking: trackingOf(band.tracking) })),
    selectivity: selectivityOf(selectivity),
    strayDb: whenFitted(strayDb),
    fixedFilter: whenFitted(fixedFilter),
    bfo: whenFitted(bfo),
    trap: whenFitted(trap),
    aerial: aerialOf(aerial),
    secondConversion: whenFitted(secondConversion),
  };
}

function aerialOf({ kind, ...primary }: ReceiverFields['aerial']): object | null {
  if (kind === 'plain') return null;
  return kind === 'loop' ? { kind } : { kind, ...primary };
}

const whenFitted = <T extends { fitted: boolean }>({ fitted, ...parts }: T) =>
  fitted ? parts : null;

type Patch = Parameters<ReceiverControls['patchValue']>[0];

/** A receiver as the fields show it. */
export function fieldsOf(receiver: ReceiverDraft): Patch {
  const { selectivity, strayDb, fixedFilter, bfo, trap, secondConversion, aerial, ...rest } =
    receiver;
  return {
    ...rest,
    bands: rest.bands.map((band) => ({
      ...band,
      circuits: [...band.circuits],
      tracking: trackingFieldsOf(band.tracking),
    })),
    selectivity: selectivityFieldsOf(selectivity),
    strayDb: { fitted: strayDb !== null, ...strayDb },
    fixedFilter: { fitted: fixedFilter !== null, ...fixedFilter },
    bfo: { fitted: bfo !== null, ...bfo },
    trap: { fitted: trap !== null, ...trap },
    aerial: aerial ?? { kind: 'plain' },
    secondConversion: { fitted: secondConversion !== null, ...secondConversion },
  };
}

/** Rows a draft must have; the rest of it may be missing or strange, the fields sort it out. */
const rowsOfDraft = z.looseObject({
  bands: z.array(z.looseObject({ circuits: z.array(z.looseObject({})) })).min(1),
  selectivity: z.looseObject({ points: z.array(z.looseObject({})).min(1).optional() }).optional(),
});

/** Writes whatever fits into the fields; answers whether it had the shape of fields at all. */
export function writeFields(form: ReceiverControls, fields: unknown): boolean {
  const rows = rowsOfDraft.safeParse(fields);
  if (!rows.success) return false;
  resize(form.controls.bands, rows.data.bands.length, bandControls);
  rows.data.bands.forEach(({ circuits }, at) => {
    const band = form.controls.bands.controls[at];
    if (band) resize(band.controls.circuits, circuits.length, circuitControls);
  });
  const points = rows.data.selectivity?.points;
  if (points) resize(form.controls.selectivity.controls.points, points.length, pointControls);
  form.patchValue(fields as Patch);
  return true;
}

function resize<T extends FormGroup>(rows: FormArray<T>, length: number, make: () => T): void {
  while (rows.length > length) rows.removeAt(-1, { emitEvent: false });
  while (rows.length < length) rows.push(make(), { emitEvent: false });
}
