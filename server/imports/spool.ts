import { randomUUID } from 'node:crypto';
import { type FileHandle, open, rename, rm } from 'node:fs/promises';

import type { ListReading } from './list-reading.ts';

/** What is stored of a station, ready for the database. */
export type StationValues = readonly (string | number | null)[];

/** A part of a spool: stations to add, or at the end the ones whose place they take. */
export type SpoolPart =
  { readonly stations: readonly StationValues[] } | { readonly replaced: readonly number[] };

const ROWS_AT_ONCE = 2000;

/*
 * A spool holds the rows of a list that a check found good, so that storing them need not read and
 * judge the list again. Its first line is the reading it was made by: only for the same is it used.
 */

/** Writes the spool of a list; it is there when it is whole, not before. */
export class SpoolWriter {
  private readonly path: string;
  private readonly part: string;
  private readonly file: FileHandle;
  private stations: StationValues[] = [];

  private constructor(path: string, part: string, file: FileHandle) {
    this.path = path;
    this.part = part;
    this.file = file;
  }

  static async begin(path: string, reading: ListReading): Promise<SpoolWriter> {
    const part = `${path}.${randomUUID()}`;
    const writer = new SpoolWriter(path, part, await open(part, 'wx', 0o600));
    await writer.writeLine(reading);
    return writer;
  }

  add(station: StationValues): void {
    this.stations.push(station);
  }

  /** Writes what has come together, once that is worth a line. */
  async flush(): Promise<void> {
    if (this.stations.length >= ROWS_AT_ONCE) await this.writeStations();
  }

  async finish(replaced: readonly number[]): Promise<void> {
    await this.writeStations();
    await this.writeLine({ replaced } satisfies SpoolPart);
    await this.file.close();
    await rename(this.part, this.path);
  }

  async giveUp(): Promise<void> {
    await this.file.close();
    await rm(this.part, { force: true });
  }

  private async writeStations(): Promise<void> {
    const { stations } = this;
    this.stations = [];
    await this.writeLine({ stations } satisfies SpoolPart);
  }

  private async writeLine(value: unknown): Promise<void> {
    await this.file.appendFile(`${JSON.stringify(value)}\n`);
  }
}

/** Whether there is a spool that was made by the same reading. */
export async function hasSpool(path: string, reading: ListReading): Promise<boolean> {
  for await (const line of linesOf(path)) return line === JSON.stringify(reading);
  return false;
}

/** The parts of a whole spool. */
export async function* spoolParts(path: string): AsyncGenerator<SpoolPart> {
  let isReading = true;
  for await (const line of linesOf(path)) {
    if (!isReading) yield JSON.parse(line) as SpoolPart;
    isReading = false;
  }
}

async function* linesOf(path: string): AsyncGenerator<string> {
  const file = await open(path).catch((error: unknown) => {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
    return null;
  });
  if (!file) return;
  try {
    yield* file.readLines();
  } finally {
    await file.close();
  }
}
