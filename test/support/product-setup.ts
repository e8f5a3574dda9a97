import type { TestProject } from 'vitest/node';

import type { DemoSignIn } from '../../server/dev/api-process.ts';
import { Product } from './product.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** Where the product runs that the journeys share. */
    readonly productUrl: string;
    readonly demoSignIns: readonly DemoSignIn[];
  }
}

/** One product for a run of journeys: client, API and database, as a user starts them. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const product = new Product();
  await product.start();
  project.provide('productUrl', product.url);
  project.provide('demoSignIns', product.signIns);
  return () => product.remove();
}
