import { HttpErrorResponse, type HttpClient } from '@angular/common/http';
import {
  catchError,
  concat,
  defer,
  map,
  Observable,
  of,
  repeat,
  retry,
  switchMap,
  takeWhile,
  throwError,
  timer,
} from 'rxjs';

import { type ImportState, importState } from '../../../../shared/contracts/list-import';

const EVERY_MS = 500;
const PATIENCE = 20;

/**
 * The state of an import now and, as long as it moves by itself, whenever the server tells that it
 * has changed; asked for twice a second where the server's events do not come through.
 */
export function watchImport(http: HttpClient, url: string): Observable<ImportState> {
  const asked = ask(http, url);
  const polled = asked.pipe(repeat({ delay: EVERY_MS }), takeWhile(isMoving, true));
  return asked.pipe(
    switchMap((state) =>
      isMoving(state)
        ? concat(of(state), told(`${url}/events`).pipe(catchError(() => polled)))
        : of(state),
    ),
  );
}

/** Whether the server is at work on it. */
export const isMoving = ({ state }: ImportState): boolean =>
  state === 'checking' || state === 'committing';

function ask(http: HttpClient, url: string): Observable<ImportState> {
  return defer(() => http.get(url)).pipe(
    map((body) => importState.parse(body)),
    retry({ count: PATIENCE, delay: (error: unknown) => waitFor(error), resetOnSuccess: true }),
  );
}

/** What the server tells until the import rests; a connection that is lost is opened again. */
function told(url: string): Observable<ImportState> {
  return new Observable<ImportState>((subscriber) => {
    if (typeof EventSource === 'undefined') {
      subscriber.error(new Error('This browser takes no events.'));
      return undefined;
    }
    const source = new EventSource(url);
    source.onmessage = ({ data }: MessageEvent<string>) => {
      const state = importState.safeParse(JSON.parse(data));
      if (state.success) subscriber.next(state.data);
      else subscriber.error(state.error);
    };
    source.onerror = () => {
      if (source.readyState === EventSource.CLOSED) subscriber.error(new Error('No more events.'));
    };
    return () => source.close();
  }).pipe(takeWhile(isMoving, true));
}

/** A connection that is lost comes back; what the server refuses does not. */
function waitFor(error: unknown): Observable<unknown> {
  const isAway = error instanceof HttpErrorResponse && (error.status === 0 || error.status === 503);
  return isAway ? timer(EVERY_MS) : throwError(() => error);
}
