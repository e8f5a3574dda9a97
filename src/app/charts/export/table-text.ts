import { csvFormatRows, tsvFormatRows } from 'd3';

import type { OriginFact } from '../chart/chart-origin';
import type { ChartTable } from '../twin-table/twin-table';

const NUMBER = /^[\u2212-]?\d+(\.\d+)?$/;
const FORMULA = /^[=+\-@\t\r\uFF1D\uFF0B\uFF0D\uFF20]/;
const NOTHING = '\u2013';

/** A cell for other programs: numbers with a plain sign, nothing for a dash, no formulas. */
export function plainCell(text: string): string {
  if (text === NOTHING) return '';
  if (NUMBER.test(text)) return text.replace('\u2212', '-');
  return FORMULA.test(text) ? `'${text}` : text;
}

/**
 * The rows as CSV (RFC 4180). What they rest on follows each row in columns of its own, so that
 * the file is read again without special rules and a row keeps its meaning when it is moved.
 */
export function tableAsCsv({ columns, rows }: ChartTable, facts: readonly OriginFact[]): string {
  const labels = facts.map(({ label }) => plainCell(label));
  const values = facts.map(({ value }) => plainCell(value));
  return csvFormatRows([
    [...columns.map(plainCell), ...labels],
    ...rows.map(({ cells }) => [...cells.map(plainCell), ...values]),
  ]);
}

/** The rows with tabs between the cells, as spreadsheets take them from the clipboard. */
export const tableAsTabs = ({ columns, rows }: ChartTable): string =>
  tsvFormatRows([columns.map(plainCell), ...rows.map(({ cells }) => cells.map(plainCell))]);
