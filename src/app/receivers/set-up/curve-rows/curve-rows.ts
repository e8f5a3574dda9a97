import { ChangeDetectionStrategy, Component, input, signal } from '@angular/core';
import type { FormArray } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';

import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { ProblemTextPipe } from '../../../ui/form-problems/problem-text-pipe';
import { Icon } from '../../../ui/icon/icon';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import { pointControls, type PointControls } from '../receiver-form/selectivity-controls';
import { pastedCurve } from './pasted-curve';

const FEWEST_POINTS = 2;
const MOST_POINTS = 200;

/** A measured selectivity curve, point by point; a spreadsheet's two columns can be pasted. */
@Component({
  selector: 'app-curve-rows',
  imports: [Icon, MatButtonModule, ProblemTextPipe, QuantityInput],
  templateUrl: './curve-rows.html',
  styleUrl: './curve-rows.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CurveRows {
  readonly points = input.required<FormArray<PointControls>>();

  protected readonly fewest = FEWEST_POINTS;
  protected readonly most = MOST_POINTS;
  /** What came of pasting. */
  protected readonly said = signal<string | null>(null);

  constructor() {
    checkWithForm(this.points);
  }

  protected add(): void {
    this.points().push(pointControls());
    this.points().markAsDirty();
  }

  protected remove(at: number): void {
    this.points().removeAt(at);
    this.points().markAsDirty();
  }

  /** Two columns take the place of all points; anything else goes into the field as usual. */
  protected paste(event: ClipboardEvent): void {
    const curve = pastedCurve(event.clipboardData?.getData('text/plain') ?? '');
    if (curve === null || this.points().disabled) return;
    event.preventDefault();
    const { points, unread } = curve;
    if (points.length < FEWEST_POINTS || points.length > MOST_POINTS) {
      this.said.set(
        $localize`${points.length}:count: points were read, and nothing was changed. Paste ${FEWEST_POINTS}:fewest: to ${MOST_POINTS}:most: rows of distance and dB.`,
      );
      return;
    }
    this.points().clear({ emitEvent: false });
    points.forEach(({ offsetHz, rejectionDb }) => {
      this.points().push(pointControls(offsetHz, rejectionDb), { emitEvent: false });
    });
    this.points().updateValueAndValidity();
    this.points().markAsDirty();
    this.said.set(
      unread.length === 0
        ? $localize`${points.length}:count: points were pasted.`
        : $localize`${points.length}:count: points were pasted. Not understood: line ${unread.join(', ')}:lines:.`,
    );
  }
}
