import type { RasterRange } from '../../shared/radio/station.ts';
import { AddingTally, type PlacedRow } from './adding-tally.ts';
import type { ListReading } from './list-reading.ts';
import { RowTally } from './row-tally.ts';

/** What comparing a list needs of the editions. */
export interface EditionMarks {
  marks(editionId: number): AsyncIterable<readonly PlacedRow[]>;
}

/**
 * A tally that knows the edition a list is compared with: the one it adds to, else the one before.
 * @param beat Is waited for between some thousand stations: reading a long edition takes its time.
 */
export async function tallyBeside(
  editions: EditionMarks,
  { addsTo }: Pick<ListReading, 'addsTo'>,
  before: number | null,
  raster: readonly RasterRange[],
  beat: () => Promise<void>,
): Promise<RowTally> {
  const tally = addsTo === null ? new RowTally(raster) : new AddingTally(raster);
  const beside = addsTo ?? before;
  if (beside === null) return tally;
  for await (const marks of editions.marks(beside)) {
    tally.know(marks);
    await beat();
  }
  return tally;
}
