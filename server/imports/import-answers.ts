import type { ImportProposal, ImportState } from '../../shared/contracts/list-import.ts';
import { isComplete } from './column-matching.ts';
import type { ImportModel } from './import-model.ts';

export const toProposal = ({ id, fileName, reading, sample }: ImportModel): ImportProposal => ({
  id,
  fileName,
  encoding: reading.encoding,
  delimiter: reading.delimiter,
  decimalMark: reading.decimalMark,
  columns: [...reading.columns],
  sample,
  complete: isComplete(reading.columns),
});

export const toState = (row: ImportModel): ImportState => ({
  id: row.id,
  state: row.state,
  progress: row.progress,
  rows: row.counts ?? null,
  editionId: row.editionId ?? null,
  reason: row.reason ?? null,
  faults: row.state === 'ready' ? (row.faults ?? []) : [],
  proposal: toProposal(row),
  label: row.label ?? null,
  date: row.date ?? null,
});
