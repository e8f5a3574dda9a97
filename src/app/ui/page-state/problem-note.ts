import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import type { Problem } from '../../../../shared/contracts/problem';

/** What went wrong, and a way on. More ways can be put inside. */
@Component({
  selector: 'app-problem-note',
  imports: [MatButtonModule],
  templateUrl: './problem-note.html',
  styleUrl: './problem-note.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProblemNote {
  readonly problem = input.required<Problem>();
  /** Offers "Try again" unless false. */
  readonly retriable = input(true);

  readonly retry = output();
}
