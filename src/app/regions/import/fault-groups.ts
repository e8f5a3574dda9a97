import { groups } from 'd3';

import type { ImportFault } from '../../../../shared/contracts/list-import';

/** Faults of one cause: the same column, the same thing expected. */
export interface FaultGroup {
  readonly column: string;
  readonly expected: string;
  readonly faults: readonly ImportFault[];
}

/** Groups faults by cause, the commonest first; within a cause by line. */
export function groupFaults(faults: readonly ImportFault[]): FaultGroup[] {
  return groups(
    faults,
    ({ column }) => column,
    ({ expected }) => expected,
  )
    .flatMap(([column, causes]) =>
      causes.map(([expected, alike]) => ({
        column,
        expected,
        faults: alike.toSorted((a, b) => a.line - b.line),
      })),
    )
    .toSorted((a, b) => b.faults.length - a.faults.length);
}
