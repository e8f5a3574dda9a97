import { DOCUMENT, effect, inject, Injectable, signal } from '@angular/core';

const THEMES = ['paper', 'walnut', 'system'] as const;
export type Theme = (typeof THEMES)[number];

const KEY = 'fallow.theme';

/** What this browser remembers of the user's taste. */
@Injectable({ providedIn: 'root' })
export class Preferences {
  private readonly document = inject(DOCUMENT);
  private readonly chosen = signal<Theme>(this.stored());

  readonly theme = this.chosen.asReadonly();

  constructor() {
    effect(() => {
      this.document.documentElement.dataset['theme'] = this.chosen();
    });
  }

  setTheme(theme: Theme): void {
    this.chosen.set(theme);
    try {
      this.document.defaultView?.localStorage.setItem(KEY, theme);
    } catch {
      // Storage is full or forbidden: the choice holds until the page is closed.
    }
  }

  private stored(): Theme {
    try {
      const found = this.document.defaultView?.localStorage.getItem(KEY);
      return THEMES.find((theme) => theme === found) ?? 'paper';
    } catch {
      return 'paper';
    }
  }
}
