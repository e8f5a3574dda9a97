import {
  type ImportColumn,
  type ImportField,
  type ImportUnit,
  importUnitsOf,
} from '../../shared/contracts/list-import.ts';
import { readCoordinate } from './cell-coordinate.ts';
import type { Axis } from './cell-hemisphere.ts';
import { type DecimalMark, isBlank } from './cell-number.ts';
import { readPlace } from './cell-place.ts';
import { readHeader } from './header-words.ts';
import type { ListReading } from './list-reading.ts';
import { patternColumns } from './pattern-headers.ts';
import { placeColumns } from './place-headers.ts';
import { unplaced } from './place-columns.ts';

/**
 * Proposes what each column holds, by its header. Of two columns for one field the first is taken.
 * A unit that neither header nor cells tell stays open: it is asked, never guessed.
 */
export function proposeColumns(
  headers: readonly string[],
  sample: readonly (readonly string[])[],
  mark: DecimalMark,
): ImportColumn[] {
  const taken = new Set<ImportField>();
  const pattern = patternColumns(headers);
  const split = placeColumns(headers);
  return headers.map((header, index) => {
    const bearing = pattern.get(index);
    if (bearing) return { header, field: 'pattern', unit: patternUnit(bearing.unit) };
    const part = split.get(index);
    const { field, unit } = part ? { field: part, unit: null } : readHeader(header);
    const cells = sample.map((row) => row[index] ?? '').filter((cell) => !isBlank(cell));
    const isOther = field === 'place' && !arePlaces(cells, mark);
    if (field === null || taken.has(field) || isOther) return { header, field: null, unit: null };
    taken.add(field);
    return { header, field, unit: unitOf(field, unit, cells, mark) };
  });
}

const patternUnit = (named: ImportUnit | null): ImportUnit | null =>
  named !== null && importUnitsOf.pattern.includes(named) ? named : null;

function unitOf(
  field: ImportField,
  named: ImportUnit | null,
  cells: readonly string[],
  mark: DecimalMark,
): ImportUnit | null {
  if (named !== null && importUnitsOf[field].includes(named)) return named;
  if (field === 'latitude' || field === 'longitude') return angleUnit(field, cells, mark);
  return importUnitsOf[field].length === 0 ? null : cellUnit(field, cells);
}

/** A column called "Position" may hold anything: it is taken for places if half of it reads so. */
const arePlaces = (cells: readonly string[], mark: DecimalMark): boolean =>
  cells.filter((cell) => readPlace(cell, mark, 'east') !== null).length * 2 > cells.length;

/** Packed digits (DDMMSS) are no decimal degrees: where most cells are, the unit is dms. */
function angleUnit(axis: Axis, cells: readonly string[], mark: DecimalMark): ImportUnit {
  const reads = (unit: ImportUnit) =>
    cells.filter((cell) => readCoordinate(cell, axis, { unit, mark }) !== null).length;
  return reads('dms') > reads('degrees') ? 'dms' : 'degrees';
}

/** The unit that every cell carries behind its number, if all carry the same. */
function cellUnit(field: ImportField, cells: readonly string[]): ImportUnit | null {
  const carried = new Set(
    cells.map((cell) => /\d\s*([a-z]+)\s*$/i.exec(cell)?.[1]?.toLowerCase() ?? ''),
  );
  // Cells that each say their unit need none; it only has to be there for those to come.
  if (carried.has('')) return null;
  const units = [...carried].map((word) =>
    importUnitsOf[field].find((unit) => unit.toLowerCase() === word),
  );
  return units.every((unit) => unit !== undefined) ? (units[0] ?? null) : null;
}

/** Whether a list can be read without asking: a frequency, a name, every unit and letter known. */
export function isComplete({
  columns,
  letterO,
}: Pick<ListReading, 'columns' | 'letterO'>): boolean {
  const fields = new Set(columns.map(({ field }) => field));
  const isNamed = fields.has('name') || fields.has('callSign');
  const isPlaced = unplaced(columns).length === 0;
  const isClear = openUnits(columns).length === 0 && letterO !== 'open';
  return fields.has('frequency') && isNamed && isPlaced && isClear;
}

/** Indexes of the columns whose unit is needed and not known; of a pattern's only the first. */
export const openUnits = (columns: readonly ImportColumn[]): number[] =>
  columns.flatMap(({ field, unit }, index) => {
    const isOpen = field !== null && unit === null && importUnitsOf[field].length > 0;
    const isAsked =
      field === 'pattern' && columns.findIndex((each) => each.field === field) < index;
    return isOpen && !isAsked ? [index] : [];
  });
