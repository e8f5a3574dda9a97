import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatChipsModule } from '@angular/material/chips';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSlideToggleModule } from '@angular/material/slide-toggle';

import { gradeWord } from '../../charts/band-strip/grade-word';
import { CauseSign } from '../../charts/cause-sign';
import { type DialView, type GradeName } from '../address/dial-view';
import { type causesHeard } from './response-rows';

const GRADES: readonly GradeName[] = [
  'very-annoying',
  'annoying',
  'slightly-annoying',
  'perceptible',
  'imperceptible',
];

/** Which responses are shown: by cause, grade and station, and whether what is hidden is. */
@Component({
  selector: 'app-response-filter',
  templateUrl: './response-filter.html',
  styleUrl: './response-filter.scss',
  imports: [
    CauseSign,
    MatButtonModule,
    MatChipsModule,
    MatFormFieldModule,
    MatInputModule,
    MatSlideToggleModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResponseFilter {
  readonly heard = input.required<ReturnType<typeof causesHeard>>();
  readonly view = input.required<DialView>();
  readonly leftOut = input.required<number>();
  readonly changed = output<Partial<DialView>>();

  protected readonly grades = GRADES.map((grade) => ({
    grade,
    word: gradeWord({ grade, hidden: null }),
  }));

  protected clear(): void {
    this.changed.emit({ causes: [], grades: [], station: '', isHiddenShown: true });
  }
}
