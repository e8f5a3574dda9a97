import { Op } from 'sequelize';

import type { ImportColumn, ImportProposal } from '../../shared/contracts/list-import.ts';
import { digest } from './fingerprint.ts';
import { ImportModel } from './import-model.ts';
import { type Inspection, inspectList } from './list-inspection.ts';
import { isRejects, REJECT_HEADERS, rejectedImport } from './list-rejects.ts';
import type { ListReading } from './list-reading.ts';

/** What proposing needs of the editions. */
export interface NamedEditions {
  latest(regionId: number): Promise<number | null>;
  named(id: number, regionId: number): Promise<{ id: number; label: string } | null>;
}

/** A file as it is proposed to be read, and by what its matching is found again. */
export interface Proposed extends Inspection {
  readonly headerKey: string;
}

/**
 * Proposes how an uploaded file is read: as it looks, with the columns of the region's last list that
 * had the same headers. A file of mended rejects is offered to complete the edition it came from.
 */
export async function proposeList(
  editions: NamedEditions,
  path: string,
  { regionId, fileName }: { regionId: number; fileName: string },
): Promise<Proposed> {
  const { reading, sample } = await inspectList(path);
  const headers = reading.columns.map(({ header }) => header);
  const completes = isRejects(headers) ? await completedBy(editions, regionId, fileName) : null;
  const remembered = await asRemembered(regionId, reading);
  return { reading: { ...remembered, completes }, sample, headerKey: headerKeyOf(headers) };
}

/** Equal for files of the same headers in any order; what a file of rejects adds does not count. */
export const headerKeyOf = (headers: readonly string[]): string => {
  const own = isRejects(headers) ? headers.slice(REJECT_HEADERS.length) : headers;
  return digest([...own].sort().join('\u001f'));
};

/** The columns as the region's last checked list with the same headers had them. */
export async function asRemembered(regionId: number, reading: ListReading): Promise<ListReading> {
  const headerKey = headerKeyOf(reading.columns.map(({ header }) => header));
  const before = await ImportModel.findOne({
    attributes: ['reading'],
    where: { regionId, headerKey, counts: { [Op.not]: null } },
    order: [['id', 'DESC']],
  });
  if (!before) return reading;
  const { columns, letterO, decimalMark } = before.reading;
  const left = [...columns];
  return {
    ...reading,
    remembered: true,
    columns: reading.columns.map((column) => taken(left, column)),
    letterO: reading.letterO === 'open' ? letterO : reading.letterO,
    decimalMark: reading.decimalMarkSure === false ? decimalMark : reading.decimalMark,
    decimalMarkSure: true,
  };
}

/** The first column of that header not taken before: a header may occur twice. */
function taken(left: ImportColumn[], column: ImportColumn): ImportColumn {
  const at = left.findIndex(({ header }) => header === column.header);
  return at < 0 ? column : (left.splice(at, 1)[0] ?? column);
}

/** The edition whose rejects a file holds: by the name we gave it, else the region's latest. */
async function completedBy(
  editions: NamedEditions,
  regionId: number,
  fileName: string,
): Promise<ImportProposal['completes']> {
  const importId = rejectedImport(fileName);
  const from =
    importId === null ? null : await ImportModel.findOne({ where: { id: importId, regionId } });
  const id = from ? from.editionId : await editions.latest(regionId);
  const edition = id === null ? null : await editions.named(id, regionId);
  return edition && { editionId: edition.id, label: edition.label };
}
