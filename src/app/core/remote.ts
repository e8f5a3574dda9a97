import { httpResource } from '@angular/common/http';
import { computed, type Signal } from '@angular/core';
import type * as z from 'zod';

import type { Problem } from '../../../shared/contracts/problem';
import { toProblem } from './api-problem';

/** Something on the server as a page draws it: its value, on its way, or a problem. */
export interface Remote<T> {
  readonly value: Signal<T | undefined>;
  readonly isLoading: Signal<boolean>;
  readonly problem: Signal<Problem | undefined>;
  reload(): void;
}

/**
 * Reads what lies at an address, again whenever the address changes; none is read while it is
 * undefined. For stores, in an injection context.
 */
export function remote<T>(address: () => string | undefined, schema: z.ZodType<T>): Remote<T> {
  // What is said again in the same words is not read again.
  const present = computed(address);
  const resource = httpResource(() => present(), { parse: (body) => schema.parse(body) });
  return {
    value: computed(() => (resource.hasValue() ? resource.value() : undefined)),
    isLoading: resource.isLoading,
    problem: computed(() => {
      const error = resource.error();
      return error === undefined ? undefined : toProblem(error);
    }),
    reload: () => {
      resource.reload();
    },
  };
}
