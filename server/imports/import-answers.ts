import type { ImportProposal, ImportState } from '../../shared/contracts/list-import.ts';
import { isComplete } from './column-matching.ts';
import type { ImportModel } from './import-model.ts';

export const toProposal = ({ id, fileName, reading, sample }: ImportModel): ImportProposal => ({
  id,
  fileName,
  encoding: reading.encoding,
  delimiter: reading.delimiter,
  decimalMark: reading.decimalMark,
  decimalMarkSure: reading.decimalMarkSure ?? true,
  headerLine: reading.headerLine,
  letterO: reading.letterO,
  remembered: reading.remembered ?? false,
  columns: [...reading.columns],
  sample,
  complete: isComplete(reading),
  completes: reading.completes ?? null,
  addsTo: reading.addsTo,
});

export const toState = (row: ImportModel): ImportState => ({
  id: row.id,
  state: row.state,
  progress: row.progress,
  rows: row.counts ?? null,
  editionId: row.editionId ?? null,
  reason: row.reason ?? null,
  faults: row.state === 'ready' ? (row.faults ?? []) : [],
  causes: row.state === 'ready' ? (row.findings?.causes ?? []) : [],
  remarks: row.findings?.remarks ?? [],
  proposal: toProposal(row),
  label: row.label ?? null,
  date: row.date ?? null,
});
