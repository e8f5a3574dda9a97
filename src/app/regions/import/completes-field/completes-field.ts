import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatRadioModule } from '@angular/material/radio';

import type { ImportProposal } from '../../../../../shared/contracts/list-import';
import type { MatchingForm } from '../matching-form';

/** Whether mended rows complete the edition they came from; asked of a file of rejects only. */
@Component({
  selector: 'app-completes-field',
  imports: [MatRadioModule, ReactiveFormsModule],
  templateUrl: './completes-field.html',
  styleUrl: './completes-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CompletesField {
  readonly form = input.required<MatchingForm>();
  readonly completes = input.required<ImportProposal['completes']>();
}
