import {
  BaseError,
  ConnectionError,
  DatabaseError,
  TimeoutError,
  UniqueConstraintError,
} from 'sequelize';

interface DriverError {
  readonly code?: unknown;
  readonly fatal?: unknown;
}

const driverError = (error: unknown): DriverError | undefined =>
  error instanceof DatabaseError ? (error.parent as DriverError) : undefined;

/** The server did the work twice over and lost: another transaction held the rows. */
export const isDeadlock = (error: unknown): boolean =>
  ['ER_LOCK_DEADLOCK', 'ER_LOCK_WAIT_TIMEOUT', 'ER_CHECKREAD'].includes(
    String(driverError(error)?.code),
  );

/** The database is not there, went away, or is too busy: the same request may pass later. */
export const isDatabaseAway = (error: unknown): boolean =>
  error instanceof ConnectionError ||
  error instanceof TimeoutError ||
  isDeadlock(error) ||
  driverError(error)?.fatal === true ||
  isLostConnection(error);

/** Sequelize and the connector do not always wrap what a broken connection says. */
function isLostConnection(error: unknown): boolean {
  if (!(error instanceof Error) || error instanceof UniqueConstraintError) return false;
  const { code } = (
    error instanceof BaseError ? (error as { parent?: unknown }).parent : error
  ) as {
    code?: unknown;
  };
  return typeof code === 'string' && LOST.has(code);
}

const LOST = new Set([
  'ER_CMD_CONNECTION_CLOSED',
  'ER_CONNECTION_KILLED',
  'ER_CONNECTION_TIMEOUT',
  'ER_SOCKET_UNEXPECTED_CLOSE',
  'ER_SOCKET_TIMEOUT',
  'ER_SERVER_SHUTDOWN',
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
]);
