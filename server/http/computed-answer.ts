import type { Response } from 'express';

/** Sends what the engine wrote as it is. */
export function sendComputed(response: Response, { json }: { readonly json: Uint8Array }): void {
  response.type('json').send(Buffer.from(json.buffer, json.byteOffset, json.byteLength));
}

/** Comes when the client leaves before it has its answer. */
export function whenClientLeaves(response: Response): AbortSignal {
  const leaving = new AbortController();
  response.once('close', () => {
    if (!response.writableFinished) leaving.abort();
  });
  return leaving.signal;
}
