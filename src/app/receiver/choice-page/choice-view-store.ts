import { computed, inject, Injectable } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';

import { choiceParams, type ChoiceView, readChoiceView } from '../address/choice-view';

/** What of the choice of IF is shown, in the address. Provided by the section. */
@Injectable()
export class ChoiceViewStore {
  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });
  private readonly said = computed(() => readChoiceView(this.query()), {
    equal: (one, other) => JSON.stringify(one) === JSON.stringify(other),
  });

  readonly window = computed(() => this.said().window);
  readonly sort = computed(() => this.said().sort);
  readonly date = computed(() => this.said().date);

  async show(change: Partial<ChoiceView>, replaceUrl = false): Promise<void> {
    await this.router.navigate([], {
      relativeTo: this.route,
      queryParams: choiceParams(change),
      queryParamsHandling: 'merge',
      replaceUrl,
      scroll: 'manual',
    });
  }
}
