import { OperationalError } from '../http/errors.ts';

/** The uploaded file cannot be read as a list; the message says why and what would be right. */
export class BadListError extends OperationalError {
  readonly status = 400;
  readonly type = 'unreadable-list';
}
