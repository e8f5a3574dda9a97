export type DecimalMark = '.' | ',';

const PATTERNS: Readonly<Record<DecimalMark, RegExp>> = {
  '.': /^[-+]?(?:\d+|\d{1,3}(?:[ ,'\u2019\u00a0\u2009\u202f]\d{3})+)?(?:\.\d*)?(?:e[-+]?\d{1,2})?$/i,
  ',': /^[-+]?(?:\d+|\d{1,3}(?:[ .'\u2019\u00a0\u2009\u202f]\d{3})+)?(?:,\d*)?(?:e[-+]?\d{1,2})?$/i,
};

/** What nearly every cell looks like, read at once. */
const PLAIN = /^-?\d+(?:\.\d+)?$/;

const BLANKS = new Set(['', '-', '\u2013', '\u2014', 'n/a']);

/** Whether a cell says nothing: empty, a dash, or "n/a". */
export const isBlank = (cell: string): boolean =>
  cell === '' || (!/^\d/.test(cell) && BLANKS.has(cell.trim().toLowerCase()));

/** Number in a cell with the file's decimal mark, thousands marks allowed; null when it is none. */
export function readNumber(cell: string, mark: DecimalMark): number | null {
  if (mark === '.' && PLAIN.test(cell)) return Number(cell);
  const text = cell.trim().replace('\u2212', '-');
  if (!/\d/.test(text) || !PATTERNS[mark].test(text)) return null;
  const plain = mark === ',' ? text.replace(/\./g, '').replace(',', '.') : text;
  const value = Number(plain.replace(/[ ,'\u2019\u00a0\u2009\u202f]/g, ''));
  return Number.isFinite(value) ? value : null;
}
