import { computed, inject, type Signal } from '@angular/core';

import { Session } from '../core/session/session';

/** Whether the user may keep regions and lists in the present workshop. In an injection context. */
export function isLibrarian(): Signal<boolean> {
  const session = inject(Session);
  return computed(() => {
    const role = session.user()?.workshop.role;
    return role === 'librarian' || role === 'admin';
  });
}
