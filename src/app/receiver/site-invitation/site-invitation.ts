import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { RouterLink } from '@angular/router';

import { namedSite } from '../../../../shared/contracts/site';
import type { Ground, ItuRegion, NoiseClass } from '../../../../shared/radio/site';
import { toProblem } from '../../core/api-problem';
import { needed } from '../../ui/form-problems/form-issues';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';
import { ITU_REGIONS } from '../../ui/itu-regions';
import { parsePlace } from '../../ui/place/place';
import { ReceiverStore } from '../receiver-page/receiver-store';

const placeText = ({ value }: { value: string }) => {
  const reading = parsePlace(value);
  if ('problem' in reading) return { problem: reading.problem };
  return reading.place === null ? { problem: $localize`Give the place of the aerial.` } : null;
};

/** There is no site yet: asks for the least that a judgement needs. */
@Component({
  selector: 'app-site-invitation',
  templateUrl: './site-invitation.html',
  styleUrl: './site-invitation.scss',
  imports: [
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
    ProblemTextPipe,
    ReactiveFormsModule,
    RouterLink,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SiteInvitation {
  private readonly store = inject(ReceiverStore);

  protected readonly regions = ITU_REGIONS;
  protected readonly form = new FormGroup({
    name: new FormControl($localize`My aerial`, { nonNullable: true }),
    latitude: new FormControl('', { nonNullable: true, validators: placeText }),
    ground: new FormControl<Ground>('average', { nonNullable: true }),
    noise: new FormControl<NoiseClass>('residential', { nonNullable: true }),
    ituRegion: new FormControl<ItuRegion | null>(
      null,
      needed($localize`Give the ITU Region: 1, 2 or 3.`),
    ),
  });
  protected readonly submission = new Submission(this.form, namedSite, toProblem);

  protected async save(): Promise<void> {
    const { latitude: typed, ...rest } = this.form.getRawValue();
    const reading = parsePlace(typed);
    const place = 'place' in reading ? reading.place : null;
    await this.submission.send({ ...rest, ...place }, (valid) => this.store.addSite(valid));
  }
}
