import { parse } from 'node:path';

import type { ImportLayout, ImportMatching } from '../../shared/contracts/list-import.ts';
import { InvalidError } from '../http/errors.ts';
import { asLaidOut, asMatched } from './asked-reading.ts';
import type { ImportModel } from './import-model.ts';
import { asRemembered, headerKeyOf, type Proposed } from './list-proposal.ts';

/** What a check is to be made by. */
export interface CheckOrder extends Proposed {
  readonly label: string;
  readonly date: string;
}

/** What an order needs of the editions. */
interface NamedEditions {
  named(id: number, regionId: number): Promise<{ label: string; date: string } | null>;
}

type Upload = Pick<ImportModel, 'regionId' | 'fileName' | 'reading' | 'sample'>;

const LABEL_CHARACTERS = 120;

/**
 * What an import is to be checked by: as asked, else as proposed; dated today if nobody says when.
 * @throws {InvalidError} If something is left open or makes no sense.
 */
export async function checkOrder(
  editions: NamedEditions,
  path: string,
  upload: Upload,
  asked: ImportMatching,
  today: string,
): Promise<CheckOrder> {
  const proposed = await proposeAnew(path, upload, asked);
  const reading = asMatched(proposed.reading, asked);
  const { addsTo } = reading;
  const completed = addsTo === null ? null : await editions.named(addsTo, upload.regionId);
  if (addsTo !== null && !completed) {
    const message = `The region has no edition with id ${addsTo} that could be added to.`;
    throw new InvalidError({ path: 'addsTo', message });
  }
  const ending = ', completed';
  const label = completed
    ? completed.label.slice(0, LABEL_CHARACTERS - ending.length) + ending
    : parse(upload.fileName).name.slice(0, LABEL_CHARACTERS) || 'List';
  return {
    ...proposed,
    reading,
    label: asked.label ?? label,
    date: asked.date ?? completed?.date ?? today,
  };
}

/** How the file is proposed to be read once its text is taken apart as asked. */
export async function proposeAnew(
  path: string,
  { regionId, reading, sample }: Upload,
  asked: ImportLayout,
): Promise<Proposed> {
  const before = { reading, sample };
  const found = await asLaidOut(path, before, asked);
  const remembered = found === before ? reading : await asRemembered(regionId, found.reading);
  const headerKey = headerKeyOf(remembered.columns.map(({ header }) => header));
  return { reading: remembered, sample: found.sample, headerKey };
}
