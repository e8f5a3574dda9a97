import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { firstValueFrom } from 'rxjs';
import type * as z from 'zod';

import { trackingAnswer } from '../../../../../shared/contracts/tracking';
import { toProblem } from '../../../core/api-problem';
import { checkWithForm } from '../../../ui/form-problems/check-with-form';
import { type FormIssue, showIssues } from '../../../ui/form-problems/form-issues';
import type { BandControls, ReceiverControls } from '../receiver-form/controls';
import { type Part, partsOf } from './parts';
import { askedOf, atField, issuesOf } from './tracking-request';

type Design = z.output<typeof trackingAnswer>;

/** Coils, trimmers and padder that a band's tracking data lead to, or why there are none. */
@Component({
  selector: 'app-tracking-parts',
  imports: [MatButtonModule],
  templateUrl: './tracking-parts.html',
  styleUrl: './tracking-parts.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TrackingParts {
  private readonly http = inject(HttpClient);

  readonly form = input.required<ReceiverControls>();
  readonly band = input.required<BandControls>();

  protected readonly isBusy = signal(false);
  protected readonly problem = signal<string | null>(null);
  private readonly found = signal<{ readonly asked: string; readonly design: Design } | null>(null);

  constructor() {
    checkWithForm(this.form);
  }

  /** The answer, until something it rests on is changed. */
  protected design(): Design | null {
    const found = this.found();
    return found?.asked === JSON.stringify(this.asked()) ? found.design : null;
  }

  protected parts(design: Design): Part[] {
    return partsOf(design, this.band().controls.oscillator.value);
  }

  protected async workOut(): Promise<void> {
    const asked = this.asked();
    this.problem.set(null);
    if (this.object(issuesOf(asked, this.bandAt()))) return;
    this.isBusy.set(true);
    try {
      const body = await firstValueFrom(this.http.post('/api/tracking', asked));
      this.found.set({ asked: JSON.stringify(asked), design: trackingAnswer.parse(body) });
    } catch (error) {
      const { title, issues = [] } = toProblem(error);
      if (!this.object(issues.map((each) => atField(each, this.bandAt())))) this.problem.set(title);
    } finally {
      this.isBusy.set(false);
    }
  }

  private object(issues: readonly FormIssue[]): boolean {
    if (issues.length === 0) return false;
    showIssues(this.form(), issues);
    this.problem.set($localize`Something is wrong above: it stands beside its field.`);
    return true;
  }

  private bandAt(): number {
    return this.form().controls.bands.controls.indexOf(this.band());
  }

  private asked(): object {
    return askedOf(this.form().controls.ifHz.value, this.band().getRawValue());
  }
}
