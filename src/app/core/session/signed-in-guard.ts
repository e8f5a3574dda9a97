import { inject } from '@angular/core';
import { type CanActivateFn, Router } from '@angular/router';

import { Session } from './session';

/** Lets in who is signed in; others sign in first and then come back to the asked address. */
export const signedInGuard: CanActivateFn = async (_route, { url }) => {
  const session = inject(Session);
  const router = inject(Router);
  await session.ready().catch(() => undefined);
  return session.isSignedIn() || router.createUrlTree(['/sign-in'], { queryParams: { next: url } });
};
