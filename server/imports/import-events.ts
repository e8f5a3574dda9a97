import type { Response } from 'express';

import type { ImportState } from '../../shared/contracts/list-import.ts';
import { type Glance, isMoving } from './import-watch.ts';

/** After so long the client has to come again: whether it still may see the import is asked then. */
const LONGEST_MS = 60_000;
const HEARTBEAT_MS = 10_000;
const COME_AGAIN_MS = 1000;

/**
 * Sends an import as server-sent events: its state now and whenever it changes, until no worker is
 * at it. A client that comes again and knows the end already is told to stay away (204).
 */
export async function sendEvents(
  response: Response,
  changes: AsyncIterable<Glance>,
  load: () => Promise<ImportState>,
): Promise<void> {
  const known = response.req.get('Last-Event-ID');
  const until = performance.now() + LONGEST_MS;
  let isOpen = false;
  const heartbeat = setInterval(() => isOpen && response.write(': still here\n\n'), HEARTBEAT_MS);
  try {
    for await (const change of changes) {
      if (response.closed) return;
      const mark = `${change.state}-${change.updatedAt.getTime()}`;
      if (!isOpen && !isMoving(change) && mark === known) {
        response.status(204);
        return;
      }
      if (!isOpen) open(response);
      isOpen = true;
      response.write(`id: ${mark}\ndata: ${JSON.stringify(await load())}\n\n`);
      if (!isMoving(change) || performance.now() > until) return;
    }
  } catch (error) {
    // Once it has begun an answer can only break off; the client comes again.
    if (!response.headersSent) throw error;
  } finally {
    clearInterval(heartbeat);
    if (response.headersSent || response.statusCode === 204) response.end();
  }
}

/** Neither a proxy nor the compression may hold events back. */
function open(response: Response): void {
  response.set({
    'Content-Type': 'text/event-stream',
    'Cache-Control': 'no-store, no-transform',
    'X-Accel-Buffering': 'no',
  });
  response.write(`retry: ${COME_AGAIN_MS}\n\n`);
}
