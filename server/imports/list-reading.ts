import type { ImportColumn, ImportProposal, LetterO } from '../../shared/contracts/list-import.ts';
import type { DecimalMark } from './cell-number.ts';
import type { CsvLayout } from './csv-rows.ts';

/** Everything that decides how a file is read: the same for preview, check and commit. */
export interface ListReading extends CsvLayout {
  readonly decimalMark: DecimalMark;
  /** Whether the file's numbers leave no other mark. */
  readonly decimalMarkSure?: boolean;
  /** Line of the column headers. */
  readonly headerLine: number;
  /** Line from which rows are stations. */
  readonly dataLine: number;
  readonly letterO: LetterO;
  readonly columns: readonly ImportColumn[];
  /** Whether the columns are matched as in an earlier list. */
  readonly remembered?: boolean;
  /** For a file of mended rejects: the edition that it can complete. */
  readonly completes?: ImportProposal['completes'];
  /** The edition whose stations the new one keeps; null: the file is the whole list. */
  readonly addsTo: number | null;
}
