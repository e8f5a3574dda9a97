import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { retry, throwError, timer } from 'rxjs';

const ATTEMPTS = 3;
const LONGEST_WAIT_S = 10;

/** Asks again for what only reads while the server says that it will soon be back. */
export const retryInterceptor: HttpInterceptorFn = (request, next) =>
  request.method === 'GET'
    ? next(request).pipe(
        retry({
          count: ATTEMPTS,
          delay: (error: unknown) =>
            error instanceof HttpErrorResponse && error.status === 503
              ? timer(waitSeconds(error) * 1000)
              : throwError(() => error),
        }),
      )
    : next(request);

function waitSeconds({ headers }: HttpErrorResponse): number {
  const asked = Number(headers.get('Retry-After') ?? 1);
  return Number.isFinite(asked) ? Math.min(Math.max(asked, 0), LONGEST_WAIT_S) : 1;
}
