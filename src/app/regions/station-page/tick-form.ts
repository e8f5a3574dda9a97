import { ChangeDetectionStrategy, Component, inject, input, output } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatRadioModule } from '@angular/material/radio';

import { correctionDraft } from '../../../../shared/contracts/correction';
import { toProblem } from '../../core/api-problem';
import { needed } from '../../ui/form-problems/form-issues';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';
import { CorrectionStore } from '../correction-store';

/** What somebody found by ear: heard, or off the air. */
@Component({
  selector: 'app-tick-form',
  imports: [
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatRadioModule,
    ProblemTextPipe,
    ReactiveFormsModule,
  ],
  templateUrl: './tick-form.html',
  styleUrl: './tick-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TickForm {
  private readonly store = inject(CorrectionStore);

  readonly regionId = input.required<number>();
  readonly stationId = input.required<number>();
  readonly noted = output();

  protected readonly form = new FormGroup({
    kind: new FormControl<'heard' | 'off-air' | null>(
      null,
      needed($localize`Say whether you heard it, or found it off the air.`),
    ),
    date: new FormControl('', { nonNullable: true }),
    note: new FormControl('', { nonNullable: true }),
  });
  protected readonly submission = new Submission(this.form, correctionDraft, toProblem);

  protected async save(): Promise<void> {
    const { kind, date, note } = this.form.getRawValue();
    const draft = { kind, stationId: this.stationId(), note, ...(date !== '' && { date }) };
    const saved = await this.submission.send(draft, (valid) =>
      this.store.add(this.regionId(), valid),
    );
    if (!saved) return;
    this.form.reset();
    this.noted.emit();
  }
}
