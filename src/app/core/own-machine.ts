import { DOCUMENT, inject, InjectionToken } from '@angular/core';

const LOOPBACK = ['localhost', '127.0.0.1', '[::1]'];

/** Whether the server runs on the user's own machine, as when somebody tries Fallow out. */
export const OWN_MACHINE = new InjectionToken<boolean>('own machine', {
  factory: () => LOOPBACK.includes(inject(DOCUMENT).location.hostname),
});
