import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { tap } from 'rxjs';

import { Session } from './session';

/** Notices that the session has ended while someone works; the call still fails as it did. */
export const sessionInterceptor: HttpInterceptorFn = (request, next) => {
  const session = inject(Session);
  return next(request).pipe(
    tap({
      error: (error: unknown) => {
        const refused = error instanceof HttpErrorResponse && error.status === 401;
        if (refused && request.url !== '/api/session') session.lapse();
      },
    }),
  );
};
