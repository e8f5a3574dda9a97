import { BreakpointObserver } from '@angular/cdk/layout';
import {
  afterRenderEffect,
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  viewChild,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { MatStepper, MatStepperModule } from '@angular/material/stepper';
import { RouterLink } from '@angular/router';
import { map } from 'rxjs';

import { Icon } from '../../../ui/icon/icon';
import { Loading } from '../../../ui/page-state/loading';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { RegionStore } from '../../region-store';
import { CheckStep } from '../check-step/check-step';
import { ColumnsStep } from '../columns-step/columns-step';
import { FileStep } from '../file-step/file-step';
import { ImportStore } from '../import-store';
import { isOpen, STEPS } from '../import-steps';
import { ResultStep } from '../result-step/result-step';
import { StoreStep } from '../store-step/store-step';

const NARROW = '(max-width: 44rem)';

/** Takes a list in, step by step. The address holds the import, so that a reload goes on. */
@Component({
  selector: 'app-import-page',
  imports: [
    CheckStep,
    ColumnsStep,
    FileStep,
    Icon,
    Loading,
    MatButtonModule,
    MatStepperModule,
    ProblemNote,
    ResultStep,
    RouterLink,
    StoreStep,
  ],
  providers: [ImportStore],
  templateUrl: './import-page.html',
  styleUrl: './import-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ImportPage {
  protected readonly list = inject(ImportStore);
  protected readonly region = inject(RegionStore).one(this.list.regionId);

  private readonly stepper = viewChild(MatStepper);

  protected readonly steps = computed(() => {
    const state = this.list.state()?.state;
    return STEPS.map((name, index) => ({
      name,
      words: STEP_WORDS[name],
      isOpen: isOpen(name, state),
      isDone: STEPS.slice(index + 1).some((later) => isOpen(later, state)),
    }));
  });
  protected readonly isNarrow = toSignal(
    inject(BreakpointObserver)
      .observe(NARROW)
      .pipe(map(({ matches }) => matches)),
    { initialValue: false },
  );

  constructor() {
    // The stepper refuses a step until those before it are marked as done: after rendering they are.
    afterRenderEffect({
      write: () => {
        const index = STEPS.indexOf(this.list.step());
        this.steps();
        const stepper = this.stepper();
        if (stepper) stepper.selectedIndex = index;
      },
    });
  }

  protected goTo(index: number): void {
    const step = STEPS[index];
    if (step) this.list.goTo(step);
  }
}

const STEP_WORDS = {
  file: $localize`File`,
  columns: $localize`Columns`,
  check: $localize`Check`,
  store: $localize`Store`,
  result: $localize`Result`,
};
