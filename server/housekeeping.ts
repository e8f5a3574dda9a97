import type { Logger } from './logger.ts';
import type { Services } from './services.ts';

const EVERY_MS = 10 * 60_000;

/** Removes now and then what has run out; safe beside another process that does the same. */
export function startHousekeeping(services: Services, log: Logger): () => void {
  const timer = setInterval(() => {
    Promise.all([
      services.sessions.forgetOld(),
      services.limits.forgetOld(),
      services.idempotency.forgetOld(),
      services.imports.tidy(),
    ]).catch((error: unknown) => log.warn({ error }, 'housekeeping failed, will be tried again'));
  }, EVERY_MS);
  timer.unref();
  return () => clearInterval(timer);
}
