import { randomUUID } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { readdir, rm, stat } from 'node:fs/promises';
import { basename, join } from 'node:path';

import type { Request, Response } from 'express';
import multer, { diskStorage, MulterError } from 'multer';

import { InvalidError, TooLargeError, UnsupportedMediaError } from '../http/errors.ts';

/** A file that was received, under a name of ours. */
export interface ReceivedFile {
  readonly storedName: string;
  /** As the sender calls it; only ever shown. */
  readonly fileName: string;
}

export const MAX_UPLOAD_BYTES = 128 * 1024 * 1024;
const ORPHAN_AGE_MS = 3_600_000;
const MULTIPART_OVERHEAD = 65_536;

/** The folder of uploaded lists. */
export class Uploads {
  private readonly folder: string;
  private readonly maxBytes: number;
  private readonly read: ReturnType<multer.Multer['single']>;

  constructor(folder: string, maxBytes = MAX_UPLOAD_BYTES) {
    this.folder = folder;
    this.maxBytes = maxBytes;
    mkdirSync(folder, { recursive: true, mode: 0o700 });
    this.read = multer({
      storage: diskStorage({
        destination: folder,
        filename: (_request, _file, name) => name(null, randomUUID()),
      }),
      limits: { fileSize: maxBytes, files: 1, fields: 0, parts: 1, headerPairs: 20 },
      defParamCharset: 'utf8',
    }).single('file');
  }

  path(storedName: string): string {
    return join(this.folder, storedName);
  }

  /** Streams the field `file` of a multipart request to a file; nothing is left of a failed one. */
  async receive(request: Request, response: Response): Promise<ReceivedFile> {
    if (!request.is('multipart/form-data')) {
      throw new UnsupportedMediaError('Send the list as multipart/form-data, in the field "file".');
    }
    // Refused by its announced size, before a byte of it is kept.
    if (Number(request.get('Content-Length')) > this.maxBytes + MULTIPART_OVERHEAD) {
      throw this.tooLarge();
    }
    await new Promise<void>((resolve, reject) => {
      this.read(request, response, (error?: Error | 'router' | 'route' | null) => {
        if (error instanceof Error) reject(this.refusal(error));
        else resolve();
      });
    });
    if (!request.file) {
      throw new InvalidError({ path: 'file', message: 'Send the list in the field "file".' });
    }
    const fileName = basename(request.file.originalname.replaceAll('\\', '/')).slice(0, 255);
    return { storedName: request.file.filename, fileName: fileName || 'list.csv' };
  }

  async remove(storedName: string): Promise<void> {
    await rm(this.path(storedName), { force: true });
  }

  /** Removes files that no import names: what a process left behind that was killed. */
  async sweep(isNamed: (names: readonly string[]) => Promise<ReadonlySet<string>>): Promise<void> {
    const names = await readdir(this.folder);
    const named = await isNamed(names);
    for (const name of names.filter((each) => !named.has(each))) {
      const age = await stat(this.path(name)).then(
        ({ mtimeMs }) => Date.now() - mtimeMs,
        () => 0,
      );
      if (age > ORPHAN_AGE_MS) await this.remove(name);
    }
  }

  private refusal(error: Error): Error {
    if (!(error instanceof MulterError)) {
      // A disk that is full or away is ours to mend; anything else is a body that broke off.
      if ((error as NodeJS.ErrnoException).syscall !== undefined) return error;
      return new InvalidError({
        path: 'file',
        message: 'The upload broke off or is no valid multipart body. Send it again.',
      });
    }
    if (error.code === 'LIMIT_FILE_SIZE') return this.tooLarge();
    return new InvalidError({
      path: error.field ?? '',
      message: 'Send one file in the field "file", and nothing else.',
    });
  }

  private tooLarge(): TooLargeError {
    const limit = Math.floor(this.maxBytes / 1024 / 1024);
    return new TooLargeError(
      `The file is larger than ${limit} MB. Leave out columns that are not needed, or split it.`,
    );
  }
}
