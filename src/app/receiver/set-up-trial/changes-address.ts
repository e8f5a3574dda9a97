import { DOCUMENT, inject, Injectable } from '@angular/core';

import type { Changes } from './changes';

/** Longer texts would make addresses that some programs cut off. */
const LONGEST = 1500;
const PREFIX = 'fallow.trial.';
const KEY = /^~[\da-z]+$/;

/** Writes changes as a text for the address; long ones are kept in this tab, under a short key. */
@Injectable({ providedIn: 'root' })
export class ChangesAddress {
  private readonly storage = inject(DOCUMENT).defaultView?.sessionStorage;

  /** Undefined: nothing is changed. */
  write(changes: Changes): string | undefined {
    const text = JSON.stringify(changes);
    if (text === '{}') return undefined;
    if (text.length <= LONGEST) return text;
    const key = `~${hashOf(text)}`;
    this.storage?.setItem(PREFIX + key, text);
    return key;
  }

  /** Null: the text says nothing that can be read, or its key is of another tab. */
  read(text: string | undefined): Changes | null {
    if (text === undefined) return {};
    const kept = KEY.test(text) ? this.storage?.getItem(PREFIX + text) : text;
    try {
      const changes: unknown = JSON.parse(kept ?? 'null');
      const isRecord = typeof changes === 'object' && !Array.isArray(changes);
      return isRecord ? (changes as Changes | null) : null;
    } catch {
      return null;
    }
  }
}

/** Equal for equal texts, so that the same trial has the same address. */
function hashOf(text: string): string {
  let hash = 0x811c9dc5;
  for (const each of text) hash = Math.imul(hash ^ (each.codePointAt(0) ?? 0), 0x01000193) >>> 0;
  return hash.toString(36) + text.length.toString(36);
}
