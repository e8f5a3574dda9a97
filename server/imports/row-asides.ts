import words from '../../datasets/import-headers.json' with { type: 'json' };
import type { ListReading } from './list-reading.ts';
import { plainWords } from './plain-words.ts';
import type { RemarkKind } from './row-remarks.ts';

const ASIDES = new Set(words.asides.map(plainWords));
const COMMENT = /^(?:#|\/\/|--|\*\*)/;
/** A table of fewer columns has rows that could as well be remarks. */
const NARROW = 3;

/** Knows the lines of one list that are no stations: comments, closing lines, headers said again. */
export class RowAsides {
  readonly #width: number;
  readonly #frequencyAt: number;
  readonly #frequencyHeader: string;

  constructor({ columns }: ListReading) {
    this.#width = columns.length;
    this.#frequencyAt = columns.findIndex(({ field }) => field === 'frequency');
    this.#frequencyHeader = columns[this.#frequencyAt]?.header ?? '';
  }

  /** What kind of aside a row is; null for a row that tells of a station. */
  kindOf(cells: readonly string[]): RemarkKind | null {
    const frequency = cells[this.#frequencyAt] ?? '';
    const code = frequency.charCodeAt(0);
    if (code >= 48 && code <= 57) return null; // It begins with a digit, as nearly all do.
    if (this.#frequencyHeader !== '' && frequency.trim() === this.#frequencyHeader) return 'header';
    if (this.#width < NARROW) return COMMENT.test(cells[0] ?? '') ? 'aside' : null;
    if (this.#frequencyAt > 0 && frequency.trim() !== '') return null;
    const said = cells.filter((cell) => cell.trim() !== '');
    const first = said[0]?.trim() ?? '';
    if (COMMENT.test(first)) return 'aside';
    if (cells.length === 1) return 'aside';
    const isEmptied = said.length <= 2 && (cells[0] ?? '').trim() !== '';
    return isEmptied && ASIDES.has(plainWords(first.split(':')[0] ?? '').replace(/ \d+$/, ''))
      ? 'aside'
      : null;
  }
}
