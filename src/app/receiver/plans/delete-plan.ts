import { inject } from '@angular/core';

import type { Plan } from '../../../../shared/contracts/plan';
import { Confirm } from '../../ui/confirm/confirm';
import { PlansStore } from './plans-store';

/** Asks, then deletes a plan; answers whether it is gone. Call in an injection context. */
export function planDeletion(): (plan: Plan) => Promise<boolean> {
  const [confirm, store] = [inject(Confirm), inject(PlansStore)];
  return async (plan) => {
    const agreed = await confirm.ask({
      title: $localize`Delete the plan ${plan.name}:plan:?`,
      text: $localize`The receiver, the site and the list stay. What was found cannot be brought back.`,
      agree: $localize`Delete the plan`,
      decline: $localize`Keep it`,
    });
    if (agreed) await store.remove(plan);
    return agreed;
  };
}
