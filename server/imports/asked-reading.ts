import type { ImportLayout, ImportMatching } from '../../shared/contracts/list-import.ts';
import { InvalidError } from '../http/errors.ts';
import { askedColumns } from './asked-columns.ts';
import { type Inspection, inspectList } from './list-inspection.ts';
import type { ListReading } from './list-reading.ts';
import { sayEastOrWest } from './place-columns.ts';

/**
 * How a file is read once its text is to be taken apart otherwise than it was: looked at anew, as
 * every column may be another now. What was not asked for and does not depend on it stays.
 * @throws {BadListError} If the file is no list when read so.
 * @throws {InvalidError} If it is not in the encoding that was asked for.
 */
export async function asLaidOut(
  path: string,
  before: Inspection,
  asked: ImportLayout,
): Promise<Inspection> {
  const { encoding, delimiter, decimalMark, completes, addsTo } = before.reading;
  const isSame = (now: string | undefined, then: string) => now === undefined || now === then;
  if (
    isSame(asked.encoding, encoding) &&
    isSame(asked.delimiter, delimiter) &&
    isSame(asked.decimalMark, decimalMark)
  ) {
    return before;
  }
  const isSameText = isSame(asked.encoding, encoding) && isSame(asked.delimiter, delimiter);
  const kept = isSameText ? { delimiter, decimalMark } : {};
  const found = await inspectList(path, { encoding, ...kept, ...asked } as ImportLayout);
  return { ...found, reading: { ...found.reading, completes: completes ?? null, addsTo } };
}

/**
 * How the rows of a file are to be read: as asked, else as proposed.
 * @throws {InvalidError} If a column, a unit or the letter O is left open, or makes no sense.
 */
export function asMatched(reading: ListReading, asked: ImportMatching): ListReading {
  const columns = askedColumns(reading.columns, asked.columns);
  const isPlaced = columns.some(sayEastOrWest);
  const letterO = asked.letterO ?? reading.letterO;
  if (isPlaced && letterO === 'open') {
    throw new InvalidError({
      path: 'letterO',
      message: 'Say what the letter O beside a longitude means: east (as in German) or west.',
    });
  }
  const addsTo = asked.addsTo === undefined ? reading.addsTo : asked.addsTo;
  return { ...reading, columns, letterO, addsTo };
}
