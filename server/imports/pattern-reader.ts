import type { ImportFault, ImportUnit } from '../../shared/contracts/list-import.ts';
import { everyTenDegrees, gainsOfPowers, readGain } from './cell-pattern.ts';
import type { CsvRow } from './csv-rows.ts';
import type { ListReading } from './list-reading.ts';
import { readPatternHeader } from './pattern-headers.ts';

interface BearingColumn {
  readonly index: number;
  readonly header: string;
  readonly bearing: number;
  readonly unit: ImportUnit;
}

/** A pattern read; the power is told where the list gives power by bearing. */
interface ReadPattern {
  readonly patternDb: readonly number[];
  readonly powerW: number | null;
}

const EXPECTED: Readonly<Partial<Record<ImportUnit, string>>> = {
  dB: 'a gain in dB from -60 to 40',
  relative: 'a relative field from 0 to 1',
};

/** Reads the columns of a pattern, one a bearing. */
export class PatternReader {
  readonly #columns: readonly BearingColumn[];
  readonly #reading: ListReading;

  private constructor(columns: readonly BearingColumn[], reading: ListReading) {
    this.#columns = columns;
    this.#reading = reading;
  }

  /** Null where no column holds a bearing. */
  static of(reading: ListReading): PatternReader | null {
    const columns = reading.columns.flatMap(({ header, field, unit }, index) => {
      const read = field === 'pattern' ? readPatternHeader(header) : null;
      return read ? { index, header, bearing: read.bearing, unit: unit ?? 'dB' } : [];
    });
    return columns.length === 0 ? null : new PatternReader(columns, reading);
  }

  /** The row's pattern; null where it tells none. What cannot be read joins the faults. */
  read({ line, cells }: CsvRow, powerW: number | null, faults: ImportFault[]): ReadPattern | null {
    const known: [number, number][] = [];
    for (const { index, header, bearing, unit } of this.#columns) {
      const cell = cells[index] ?? '';
      const gain = readGain(cell, unit, this.#reading.decimalMark);
      if (typeof gain === 'number') known.push([bearing, gain]);
      if (gain !== null) continue;
      const expected = EXPECTED[unit] ?? `a power in ${unit}`;
      faults.push({ line, column: header, value: cell.slice(0, 200), expected });
    }
    if (known.length === 0) return null;
    const isPower = this.#columns[0]?.unit !== 'dB' && this.#columns[0]?.unit !== 'relative';
    if (!isPower) return { patternDb: everyTenDegrees(known), powerW: null };
    return gainsOfPowers(known, powerW);
  }
}
