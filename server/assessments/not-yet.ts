import type { ReceiverDraft } from '../../shared/contracts/receiver.ts';
import { NotYetError } from '../http/errors.ts';

interface Asked {
  readonly receiver: ReceiverDraft;
  readonly maxM?: number;
  readonly maxN?: number;
}

/** What the contract has and the engine does not compute yet: where it is used in a request. */
const NOT_YET: readonly ((asked: Asked) => readonly string[])[] = [
  ({ receiver }) => used(receiver.selectivity.kind !== 'widths', 'receiver.selectivity.kind'),
  ({ receiver }) => used(receiver.aerial !== null, 'receiver.aerial'),
  ({ receiver }) => used(receiver.secondConversion !== null, 'receiver.secondConversion'),
  ({ receiver }) =>
    receiver.bands.flatMap(({ tracking }, index) =>
      used(tracking !== null, `receiver.bands.${index}.tracking`),
    ),
  ({ maxM = 0 }) => used(maxM > 3, 'maxM'),
  ({ maxN = 0 }) => used(maxN > 2, 'maxN'),
];

const used = (isUsed: boolean, path: string): string[] => (isUsed ? [path] : []);

/** @throws {NotYetError} If the request asks for what is not computed yet; names each field. */
export function refuseNotYet(asked: Asked): void {
  const paths = NOT_YET.flatMap((paths) => paths(asked));
  if (paths.length === 0) return;
  throw new NotYetError(
    ...paths.map((path) => ({ path, message: 'not yet: this is not computed so far.' })),
  );
}
