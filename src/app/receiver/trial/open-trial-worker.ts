// Under this name the build finds the worker's file and bundles it.
import { TrustedWorker as Worker } from './trusted-worker';

/** Starts the engine beside the page. */
export const openTrialWorker = (): Worker =>
  new Worker(new URL('./trial.worker', import.meta.url), { type: 'module' });
