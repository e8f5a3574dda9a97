import type { ImportState } from '../../../../shared/contracts/list-import';

/** Steps of an import, in their order. */
export const STEPS = ['file', 'columns', 'check', 'store', 'result'] as const;
export type ImportStep = (typeof STEPS)[number];

/** Steps that make sense in each state; the first is where one goes on by default. */
const OPEN: Readonly<Record<ImportState['state'], readonly [ImportStep, ...ImportStep[]]>> = {
  uploaded: ['columns', 'file'],
  checking: ['columns'],
  ready: ['check', 'file', 'columns', 'store'],
  failed: ['store', 'file', 'columns', 'check'],
  committing: ['store'],
  committed: ['result'],
  cancelled: ['result'],
  undone: ['result'],
};

/** Whether a step can be opened in that state; without an import there is only the file. */
export function isOpen(step: ImportStep, state: ImportState['state'] | undefined): boolean {
  return state === undefined ? step === 'file' : OPEN[state].includes(step);
}

/** The step to show: the wanted one if it is open, else where the state goes on. */
export function stepFor(
  wanted: string | undefined,
  state: ImportState['state'] | undefined,
): ImportStep {
  if (state === undefined) return 'file';
  return OPEN[state].find((step) => step === wanted) ?? OPEN[state][0];
}
