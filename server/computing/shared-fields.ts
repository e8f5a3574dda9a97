import { FIELD_NOTES, type FieldStrength } from '../../shared/radio/propagation/field-strength.ts';
import type { Station } from '../../shared/radio/station.ts';

/**
 * Fields of a list at a site in shared memory: whichever thread comes first fills them, all others
 * read them. What is null is kept as NaN, notes as one bit each.
 */
export interface SharedFields {
  readonly state: Int32Array;
  /** The columns of `NAMES`, one behind the other. */
  readonly numbers: Float64Array;
  readonly notes: Uint32Array;
}

const NAMES = ['distanceM', 'groundDb', 'skyDb', 'fieldDb'] as const;
const NOTES: readonly string[] = Object.values(FIELD_NOTES);
const [EMPTY, BEING_FILLED, READY] = [0, 1, 2];

/** A thread that was ended may leave its work half done: then another does it. */
const PATIENCE_MS = 5000;

/** Room for the fields of so many stations. */
export const roomForFields = (count: number): SharedFields => ({
  state: new Int32Array(new SharedArrayBuffer(4)),
  numbers: new Float64Array(new SharedArrayBuffer(8 * NAMES.length * count)),
  notes: new Uint32Array(new SharedArrayBuffer(4 * count)),
});

/** The fields kept there, made where nobody has made them. For threads: it may wait for another. */
export function keptFields(
  shared: SharedFields,
  stations: readonly Station[],
  make: () => readonly FieldStrength[],
): FieldStrength[] {
  ensureFilled(shared, make);
  return read(shared, stations);
}

/** Distance and field alone, as they are kept: NaN where there is none. For threads. */
export function keptColumns(shared: SharedFields, make: () => readonly FieldStrength[]) {
  ensureFilled(shared, make);
  const count = shared.notes.length;
  const column = (name: (typeof NAMES)[number]) =>
    shared.numbers.subarray(NAMES.indexOf(name) * count, (NAMES.indexOf(name) + 1) * count);
  return { distanceM: column('distanceM'), fieldDb: column('fieldDb') };
}

function ensureFilled(shared: SharedFields, make: () => readonly FieldStrength[]): void {
  const { state } = shared;
  const found = Atomics.compareExchange(state, 0, EMPTY, BEING_FILLED);
  if (found === BEING_FILLED) Atomics.wait(state, 0, BEING_FILLED, PATIENCE_MS);
  if (Atomics.load(state, 0) !== READY) fill(shared, make);
}

function fill({ state, numbers, notes }: SharedFields, make: () => readonly FieldStrength[]): void {
  try {
    const fields = make();
    fields.forEach((field, index) => {
      NAMES.forEach((name, at) => {
        numbers[at * fields.length + index] = field[name] ?? NaN;
      });
      notes[index] = field.notes.reduce((bits, note) => bits | (1 << NOTES.indexOf(note)), 0);
    });
    Atomics.store(state, 0, READY);
  } catch (error) {
    Atomics.store(state, 0, EMPTY);
    throw error;
  } finally {
    Atomics.notify(state, 0);
  }
}

function read({ numbers, notes }: SharedFields, stations: readonly Station[]): FieldStrength[] {
  const count = stations.length;
  const at = (column: number, index: number): number | null => {
    const value = numbers[column * count + index] ?? NaN;
    return Number.isNaN(value) ? null : value;
  };
  return stations.map(({ id }, index) => ({
    station: id,
    distanceM: at(0, index),
    groundDb: at(1, index),
    skyDb: at(2, index),
    fieldDb: at(3, index),
    notes: notesOf(notes[index] ?? 0),
  }));
}

const notesOf = (bits: number): string[] =>
  bits === 0 ? [] : NOTES.filter((_, bit) => (bits & (1 << bit)) !== 0);
