import { DOCUMENT } from '@angular/common';
import { ApplicationRef, inject, Injectable, signal } from '@angular/core';

/** Width of the drawing on paper, CSS pixels: A4 and Letter less their margins hold it. */
export const PAPER_WIDTH = 672;

/** Says when the page is laid out for paper, where every chart stands with its whole table. */
@Injectable({ providedIn: 'root' })
export class Printing {
  private readonly application = inject(ApplicationRef);
  private readonly state = signal(false);

  readonly isOn = this.state.asReadonly();

  constructor() {
    const window = inject(DOCUMENT).defaultView;
    window?.addEventListener('beforeprint', () => {
      this.turn(true);
    });
    window?.addEventListener('afterprint', () => {
      this.turn(false);
    });
  }

  private turn(isOn: boolean): void {
    this.state.set(isOn);
    // The browser lays the page out as soon as the event is over: it cannot wait for the next turn.
    this.application.tick();
  }
}
