import type { RasterRange } from '../../shared/radio/station.ts';
import { AddingTally, type PlacedRow } from './adding-tally.ts';
import type { ListReading } from './list-reading.ts';
import { RowTally } from './row-tally.ts';

/** What comparing a list needs of the editions. */
export interface EditionMarks {
  marks(editionId: number): AsyncIterable<readonly PlacedRow[]>;
}

/** A tally that knows the edition a list is compared with: the one it adds to, else the one before. */
export async function tallyBeside(
  editions: EditionMarks,
  { addsTo }: Pick<ListReading, 'addsTo'>,
  before: number | null,
  raster: readonly RasterRange[],
): Promise<RowTally> {
  if (addsTo !== null) return addingTally(editions, addsTo, raster);
  const tally = new RowTally(raster);
  if (before === null) return tally;
  for await (const marks of editions.marks(before)) tally.know(marks);
  return tally;
}

/** A tally of rows that are added to an edition. */
export async function addingTally(
  editions: EditionMarks,
  addsTo: number,
  raster: readonly RasterRange[] = [],
): Promise<AddingTally> {
  const tally = new AddingTally(raster);
  for await (const marks of editions.marks(addsTo)) tally.know(marks);
  return tally;
}
