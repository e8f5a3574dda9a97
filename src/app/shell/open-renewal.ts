import { inject, Injector } from '@angular/core';

/** Gives a function that asks for the password again over the page, once at a time. */
export function openRenewal(): () => Promise<void> {
  const injector = inject(Injector);
  return async () => {
    const [{ MatDialog }, { RenewSession }] = await Promise.all([
      import('@angular/material/dialog'),
      import('./renew-session/renew-session'),
    ]);
    injector.get(MatDialog).open(RenewSession, { maxWidth: '26rem', disableClose: true });
  };
}
