import { afterNextRender, Directive, ElementRef, inject } from '@angular/core';

/** Heading of a step; takes the focus when its step opens, so that nobody is left behind. */
@Directive({ selector: '[appStepHeading]', host: { tabindex: '-1' } })
export class StepHeading {
  constructor() {
    const heading = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    afterNextRender({
      read: () => {
        heading.focus({ preventScroll: true });
      },
    });
  }
}
