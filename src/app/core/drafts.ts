import { DOCUMENT, inject, Injectable } from '@angular/core';

import { Session } from './session/session';

const PREFIX = 'fallow.draft';
const VISITOR = 'visitor';

/** Unsaved work that outlives a closed tab. Kept in this browser, apart for each account. */
@Injectable({ providedIn: 'root' })
export class Drafts {
  private readonly storage = inject(DOCUMENT).defaultView?.localStorage;
  private readonly session = inject(Session);

  /** The draft of that name, or null; a visitor's is taken over by whoever signs in next. */
  read(name: string): unknown {
    try {
      const text =
        this.storage?.getItem(this.key(name)) ??
        this.storage?.getItem(`${PREFIX}.${VISITOR}.${name}`);
      return text == null ? null : (JSON.parse(text) as unknown);
    } catch {
      return null;
    }
  }

  write(name: string, value: unknown): void {
    try {
      this.storage?.setItem(this.key(name), JSON.stringify(value));
    } catch {
      // Storage is full or forbidden: the page still asks before it is left.
    }
  }

  remove(name: string): void {
    this.storage?.removeItem(this.key(name));
    this.storage?.removeItem(`${PREFIX}.${VISITOR}.${name}`);
  }

  private key(name: string): string {
    return `${PREFIX}.${this.session.user()?.id ?? VISITOR}.${name}`;
  }
}
