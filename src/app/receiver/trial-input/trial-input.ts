import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  model,
  output,
  signal,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';

import { frequencyHz } from '../../../../shared/contracts/quantities';
import { kilohertz } from '../../charts/readings';
import { formatQuantity, parseQuantity } from '../../ui/quantity/quantity';

/** The IF on trial, typed; the equal of the marker in the chart. */
@Component({
  selector: 'app-trial-input',
  templateUrl: './trial-input.html',
  styleUrl: './trial-input.scss',
  imports: [MatButtonModule, MatFormFieldModule, MatInputModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrialInput {
  readonly presentHz = input.required<number>();
  readonly trialHz = model.required<number>();
  readonly settled = output();

  protected readonly problem = signal('');
  protected readonly text = computed(() => formatQuantity(this.trialHz(), 'frequency'));
  protected readonly present = computed(() => kilohertz(this.presentHz()));
  protected readonly isMoved = computed(() => this.trialHz() !== this.presentHz());

  protected read(typed: string): void {
    const reading = parseQuantity(typed, 'frequency');
    if ('problem' in reading) {
      this.problem.set(reading.problem);
      return;
    }
    const checked = frequencyHz.safeParse(reading.value);
    this.problem.set(checked.error?.issues[0]?.message ?? '');
    if (checked.success) this.put(checked.data);
  }

  protected back(): void {
    this.put(this.presentHz());
  }

  private put(hz: number): void {
    this.problem.set('');
    this.trialHz.set(hz);
    this.settled.emit();
  }
}
