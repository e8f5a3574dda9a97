import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatProgressBarModule } from '@angular/material/progress-bar';

/** Something is on its way. */
@Component({
  selector: 'app-loading',
  imports: [MatProgressBarModule],
  template: `<mat-progress-bar mode="indeterminate" [attr.aria-label]="label()" />`,
  styles: ':host { display: block; padding-block: 1rem; }',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Loading {
  /** What is loading, for those who do not see the bar. */
  readonly label = input.required<string>();
}
