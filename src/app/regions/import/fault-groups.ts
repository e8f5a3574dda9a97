import { groups } from 'd3';

import type { ImportCause, ImportFault } from '../../../../shared/contracts/list-import';

/** Faults of one cause: the same column, the same thing expected. */
export interface FaultGroup {
  readonly column: string;
  readonly expected: string;
  /** Rows with this fault, also those that are not told one by one. */
  readonly count: number;
  readonly faults: readonly ImportFault[];
}

/**
 * Groups faults by cause, the commonest first; within a cause by line. Of very many faults only the
 * first are told; the causes know how many there are.
 */
export function groupFaults(
  faults: readonly ImportFault[],
  causes: readonly ImportCause[] = [],
): FaultGroup[] {
  const counts = new Map(causes.map((cause) => [keyOf(cause), cause.count]));
  return groups(
    faults,
    ({ column }) => column,
    ({ expected }) => expected,
  )
    .flatMap(([column, causes]) =>
      causes.map(([expected, alike]) => ({
        column,
        expected,
        count: counts.get(keyOf({ column, expected })) ?? alike.length,
        faults: alike.toSorted((a, b) => a.line - b.line),
      })),
    )
    .toSorted((a, b) => b.count - a.count);
}

const keyOf = ({ column, expected }: Pick<FaultGroup, 'column' | 'expected'>): string =>
  JSON.stringify([column, expected]);
