import type { ImportState } from '../../shared/contracts/list-import.ts';
import { ConflictError } from '../http/errors.ts';

const WORDS: Readonly<Partial<Record<ImportState['state'], string>>> = {
  checking: 'is being checked',
  committing: 'is being stored',
  committed: 'has been stored',
  cancelled: 'was cancelled',
  undone: 'was undone',
};

/** Says why an import cannot be changed at present. */
export const busy = ({ state }: Pick<ImportState, 'state'>): ConflictError =>
  new ConflictError(`This import ${WORDS[state] ?? 'has changed'}.`);
