import { type ReceiverDraft, receiverDraft } from '../../../../shared/contracts/receiver';
import { formatQuantity, parseQuantity } from '../../ui/quantity/quantity';
import { applyChanges, valueAt } from './changes';
import type { TrialField } from './trial-fields';
import { isPart, kindOf, partOf } from './trial-parts';

/** The receiver with a field set as typed, or why that cannot be. */
export type SetField = { readonly receiver: ReceiverDraft } | { readonly problem: string };

/** Sets a field to what was typed or chosen; the whole set must still be one that can be built. */
export function setField(receiver: ReceiverDraft, field: TrialField, typed: string): SetField {
  const read = readField(receiver, field, typed);
  if ('problem' in read) return read;
  const changed = applyChanges(receiver, { [field.path]: read.value });
  const { data, error } = receiverDraft.safeParse(changed);
  if (data) return { receiver: data };
  return { problem: error.issues[0]?.message ?? $localize`This set could not be built.` };
}

function readField(
  receiver: ReceiverDraft,
  { path, entry }: TrialField,
  typed: string,
): { readonly value: unknown } | { readonly problem: string } {
  if (entry.kind === 'choice') {
    return { value: isPart(path) ? partOf(receiver, path, typed) : typed };
  }
  if (entry.kind === 'quantity') return parseQuantity(typed, entry.quantity);
  const reading = parseQuantity(typed, 'plain');
  if ('problem' in reading) return reading;
  return { value: resized(valueAt(receiver, path), Math.round(reading.value ?? 0)) };
}

const TYPICAL = { qLow: 80, qHigh: 80 };
const MOST = 20;

/** As many circuits as asked for; new ones are like the last. */
function resized(circuits: unknown, length: number): unknown[] {
  const list = Array.isArray(circuits) ? (circuits as unknown[]) : [];
  const last = list.at(-1) ?? TYPICAL;
  return Array.from({ length: Math.min(Math.max(length, 0), MOST) }, (_, at) => list[at] ?? last);
}

/** What stands in the field, as it would be typed. */
export function fieldText(receiver: ReceiverDraft, { path, entry }: TrialField): string {
  const value = valueAt(receiver, path);
  if (isPart(path)) return kindOf(receiver, path);
  if (entry.kind === 'count') return String(Array.isArray(value) ? value.length : 0);
  if (entry.kind === 'choice') return typeof value === 'string' ? value : '';
  return formatQuantity(typeof value === 'number' ? value : null, entry.quantity);
}
