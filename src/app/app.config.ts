import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { type ApplicationConfig, provideBrowserGlobalErrorListeners } from '@angular/core';
import {
  provideRouter,
  TitleStrategy,
  withComponentInputBinding,
  withExperimentalAutoCleanupInjectors,
  withInMemoryScrolling,
} from '@angular/router';

import { routes } from './app.routes';
import { idempotencyInterceptor } from './core/idempotency-interceptor';
import { PageTitle } from './core/page-title';
import { retryInterceptor } from './core/retry-interceptor';
import { sessionInterceptor } from './core/session/session-interceptor';

export const appConfig: ApplicationConfig = {
  providers: [
    provideBrowserGlobalErrorListeners(),
    provideRouter(
      routes,
      withComponentInputBinding(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled', anchorScrolling: 'enabled' }),
      // A store given by a route is dropped when the route is left, as we rely on.
      withExperimentalAutoCleanupInjectors(),
    ),
    provideHttpClient(
      withInterceptors([sessionInterceptor, idempotencyInterceptor, retryInterceptor]),
    ),
    { provide: TitleStrategy, useClass: PageTitle },
  ],
};
