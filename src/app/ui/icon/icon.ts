import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { type IconName, iconPaths } from './icon-paths';

/** A sign drawn in the colour of the text around it. Silent: what it means is said in words. */
@Component({
  selector: 'app-icon',
  template: `
    <svg viewBox="0 0 24 24" aria-hidden="true" focusable="false">
      <path [attr.d]="path()" />
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
      flex: none;
      width: 1.25em;
      height: 1.25em;
      vertical-align: -0.25em;
    }
    :host-context([mat-icon-button]) {
      display: flex;
      width: 1em;
      height: 1em;
    }
    path {
      fill: none;
      stroke: currentColor;
      stroke-width: 1.75;
      stroke-linecap: round;
      stroke-linejoin: round;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Icon {
  readonly name = input.required<IconName>();

  protected readonly path = computed(() => iconPaths[this.name()]);
}
