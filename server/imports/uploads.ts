import { randomUUID } from 'node:crypto';
import { mkdirSync } from 'node:fs';
import { access, readdir, rm, stat } from 'node:fs/promises';
import { basename, join } from 'node:path';

import type { Request, Response } from 'express';
import multer, { diskStorage, MulterError } from 'multer';

import {
  InvalidError,
  TooLargeError,
  UnavailableError,
  UnsupportedMediaError,
} from '../http/errors.ts';

/** A file that was received, under a name of ours. */
export interface ReceivedFile {
  readonly storedName: string;
  /** As the sender calls it; only ever shown. */
  readonly fileName: string;
}

export const MAX_UPLOAD_BYTES = 128 * 1024 * 1024;
const SPOOL_ENDING = '.spool';
const UUID_LENGTH = 36;
const ORPHAN_AGE_MS = 3_600_000;
/** Of 128 MB in that time even a slow line is capable; one that is held open costs a place. */
const LONGEST_UPLOAD_MS = 10 * 60_000;
const MAX_RECEIVING = 8;
const MULTIPART_OVERHEAD = 65_536;

/** The upload that a file of the folder belongs to. */
const storedNameOf = (name: string): string => name.slice(0, UUID_LENGTH);

/** The folder of uploaded lists. */
export class Uploads {
  private readonly folder: string;
  private readonly maxBytes: number;
  private readonly limitMs: number;
  private receiving = 0;
  private readonly read: ReturnType<multer.Multer['single']>;

  constructor(folder: string, maxBytes = MAX_UPLOAD_BYTES, limitMs = LONGEST_UPLOAD_MS) {
    this.folder = folder;
    this.maxBytes = maxBytes;
    this.limitMs = limitMs;
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
    if (this.receiving >= MAX_RECEIVING) {
      throw new UnavailableError('Many lists are being uploaded. Try again shortly.');
    }
    this.receiving += 1;
    const limit = setTimeout(() => request.destroy(), this.limitMs);
    try {
      await this.readFile(request, response);
    } finally {
      clearTimeout(limit);
      this.receiving -= 1;
    }
    if (!request.file) {
      throw new InvalidError({ path: 'file', message: 'Send the list in the field "file".' });
    }
    const fileName = basename(request.file.originalname.replaceAll('\\', '/')).slice(0, 255);
    return { storedName: request.file.filename, fileName: fileName || 'list.csv' };
  }

  /** Where the good rows of a checked list wait to be stored. */
  spool(storedName: string): string {
    return `${this.path(storedName)}${SPOOL_ENDING}`;
  }

  has(storedName: string): Promise<boolean> {
    return access(this.path(storedName)).then(
      () => true,
      () => false,
    );
  }

  async remove(storedName: string): Promise<void> {
    await rm(this.path(storedName), { force: true });
    await this.removeSpool(storedName);
  }

  async removeSpool(storedName: string): Promise<void> {
    await rm(this.spool(storedName), { force: true });
  }

  /**
   * Removes what a process left behind that was killed.
   * @param findKept Which of the uploads are still needed, and whether they are yet to be stored.
   */
  async sweep(
    findKept: (storedNames: readonly string[]) => Promise<ReadonlyMap<string, boolean>>,
  ): Promise<void> {
    const names = await readdir(this.folder);
    const kept = await findKept([...new Set(names.map(storedNameOf))]);
    for (const name of names) {
      const isToBeStored = kept.get(storedNameOf(name));
      const isUpload = name === storedNameOf(name);
      const isSpool = name === `${storedNameOf(name)}${SPOOL_ENDING}`;
      if (isToBeStored === undefined ? false : isUpload || (isSpool && isToBeStored)) continue;
      const age = await stat(this.path(name)).then(
        ({ mtimeMs }) => Date.now() - mtimeMs,
        () => 0,
      );
      if (age > ORPHAN_AGE_MS) await rm(this.path(name), { force: true });
    }
  }

  private readFile(request: Request, response: Response): Promise<void> {
    return new Promise((resolve, reject) => {
      this.read(request, response, (error?: Error | 'router' | 'route' | null) => {
        if (error instanceof Error) reject(this.refusal(error));
        else resolve();
      });
    });
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
