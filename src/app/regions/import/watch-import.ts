import { HttpErrorResponse, type HttpClient } from '@angular/common/http';
import { defer, map, type Observable, repeat, retry, takeWhile, throwError, timer } from 'rxjs';

import { type ImportState, importState } from '../../../../shared/contracts/list-import';

const EVERY_MS = 500;
const PATIENCE = 20;

/** The state of an import now and, as long as it moves by itself, twice a second until it rests. */
export function watchImport(http: HttpClient, url: string): Observable<ImportState> {
  return defer(() => http.get(url)).pipe(
    map((body) => importState.parse(body)),
    retry({ count: PATIENCE, delay: (error: unknown) => waitFor(error), resetOnSuccess: true }),
    repeat({ delay: EVERY_MS }),
    takeWhile(isMoving, true),
  );
}

/** Whether the server is at work on it. */
export const isMoving = ({ state }: ImportState): boolean =>
  state === 'checking' || state === 'committing';

/** A connection that is lost comes back; what the server refuses does not. */
function waitFor(error: unknown): Observable<unknown> {
  const isAway = error instanceof HttpErrorResponse && (error.status === 0 || error.status === 503);
  return isAway ? timer(EVERY_MS) : throwError(() => error);
}
