import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';

import { OWN_MACHINE } from '../../core/own-machine';
import { Session } from '../../core/session/session';
import type { Trial } from '../trial';

/** Leads from the visitor's answer to a set of one's own, with what was chosen so far. */
@Component({
  selector: 'app-next-step',
  imports: [MatButtonModule, RouterLink],
  templateUrl: './next-step.html',
  styleUrl: './next-step.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NextStep {
  private readonly router = inject(Router);
  protected readonly session = inject(Session);

  readonly trial = input<Trial>();

  protected readonly isOwnMachine = inject(OWN_MACHINE);
  /** Where this set can be set up and kept. */
  protected readonly setUp = computed(() => {
    const trial = this.trial();
    const path = '/receivers/new';
    const queryParams = trial ? { type: trial.type.id, ifHz: trial.ifHz } : {};
    return {
      path,
      queryParams,
      url: this.router.createUrlTree([path], { queryParams }).toString(),
    };
  });
}
