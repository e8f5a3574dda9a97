import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** Nothing is here yet: says so, and holds the way on. */
@Component({
  selector: 'app-empty',
  template: `
    <h2>{{ title() }}</h2>
    <ng-content />
  `,
  styles: `
    :host {
      display: grid;
      justify-items: start;
      gap: 0.75rem;
      padding-block: 2rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Empty {
  readonly title = input.required<string>();
}
