import {
  type ImportColumn,
  type ImportMatching,
  importUnitsOf,
} from '../../shared/contracts/list-import.ts';
import { InvalidError } from '../http/errors.ts';
import { openUnits } from './column-matching.ts';
import { readPatternHeader } from './pattern-headers.ts';
import { unplaced } from './place-columns.ts';

type Asked = NonNullable<ImportMatching['columns']>;
type Issue = InvalidError['issues'][number];

/**
 * The columns by which a list is to be read: as asked, else as proposed. What is asked names the
 * file's own headers; a header that occurs twice is taken in the file's order; a column that is not
 * named is not read.
 * @throws {InvalidError} If a header is unknown, a field doubled, a unit open or wrong.
 */
export function askedColumns(
  proposed: readonly ImportColumn[],
  asked: Asked | undefined,
): ImportColumn[] {
  const columns = sharedPattern(asked ? placed(proposed, asked) : [...proposed]);
  const issues = [
    ...doubled(columns),
    ...wrongBearings(columns),
    ...wrongUnits(columns),
    ...missing(columns),
  ];
  if (issues.length > 0) throw new InvalidError(...issues);
  return columns;
}

/** A pattern is given in one unit: said of one of its columns, it holds for all. */
function sharedPattern(columns: readonly ImportColumn[]): ImportColumn[] {
  const said =
    columns.find(({ field, unit }) => field === 'pattern' && unit !== null)?.unit ?? null;
  return columns.map((column) =>
    column.field === 'pattern' && column.unit === null ? { ...column, unit: said } : column,
  );
}

function wrongBearings(columns: readonly ImportColumn[]): Issue[] {
  const met = new Map<number, string>();
  return columns.flatMap(({ header, field }, index) => {
    if (field !== 'pattern') return [];
    const bearing = readPatternHeader(header)?.bearing;
    const other = bearing === undefined ? undefined : met.get(bearing);
    if (bearing !== undefined) met.set(bearing, header);
    if (bearing !== undefined && other === undefined) return [];
    const message =
      other === undefined
        ? `"${header}" names no bearing: a column of a pattern is called such as "pattern_010".`
        : `"${header}" and "${other}" name the same bearing.`;
    return { path: `columns.${index}.field`, message };
  });
}

function placed(proposed: readonly ImportColumn[], asked: Asked): ImportColumn[] {
  const columns: ImportColumn[] = proposed.map(({ header }) => ({
    header,
    field: null,
    unit: null,
  }));
  const free = new Set(columns.keys());
  const unknown: Issue[] = [];
  asked.forEach(({ header, field, unit }, index) => {
    const at = [...free].find((each) => columns[each]?.header === header.trim());
    if (at === undefined) {
      unknown.push({
        path: `columns.${index}.header`,
        message: `The file has no column "${header}" left.`,
      });
      return;
    }
    free.delete(at);
    columns[at] = { header: header.trim(), field, unit: unit ?? plainUnit(field, proposed[at]) };
  });
  if (unknown.length > 0) throw new InvalidError(...unknown);
  return columns;
}

/** A place without a unit is read as proposed, or in degrees; a quantity is never guessed. */
function plainUnit(field: ImportColumn['field'], proposed: ImportColumn | undefined) {
  if (field !== 'latitude' && field !== 'longitude') return null;
  return proposed?.field === field ? proposed.unit : 'degrees';
}

function doubled(columns: readonly ImportColumn[]): Issue[] {
  return columns.flatMap(({ field, header }, index) => {
    const first = columns.findIndex((each) => each.field === field);
    if (field === null || field === 'pattern' || first === index) return [];
    return {
      path: `columns.${index}.field`,
      message: `"${header}" and "${columns[first]?.header ?? ''}" cannot both hold the ${field}.`,
    };
  });
}

function wrongUnits(columns: readonly ImportColumn[]): Issue[] {
  const open = openUnits(columns);
  return columns.flatMap(({ field, header, unit }, index) => {
    if (field === null) return [];
    const isWrong = unit !== null && !importUnitsOf[field].includes(unit);
    if (!isWrong && !open.includes(index)) return [];
    const units = importUnitsOf[field].join(', ') || 'none';
    return {
      path: `columns.${index}.unit`,
      message: `Say in which unit "${header}" is given. Possible: ${units}.`,
    };
  });
}

function missing(columns: readonly ImportColumn[]): Issue[] {
  const has = (field: ImportColumn['field']) => columns.some((each) => each.field === field);
  const issues: Issue[] = [];
  if (!has('frequency')) {
    issues.push({ path: 'columns', message: 'Say which column holds the frequency.' });
  }
  issues.push(...unplaced(columns).map((message) => ({ path: 'columns', message })));
  return issues;
}
