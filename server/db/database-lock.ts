import { createConnection } from 'mariadb';

const PATIENCE_SECONDS = 120;

/**
 * Runs work that only one process may do at a time, such as migrating. The lock belongs to a
 * connection of its own, so that it is free again when the process dies.
 */
export async function underDatabaseLock<T>(
  url: string,
  name: string,
  work: () => Promise<T>,
): Promise<T> {
  const connection = await createConnection(url.replace(/^mysql:/, 'mariadb:'));
  connection.on('error', () => undefined); // The work itself notices that the server went away.
  try {
    const rows: unknown = await connection.query(
      "SELECT GET_LOCK(CONCAT(DATABASE(), '.', ?), ?) = 1 AS isHeld",
      [name, PATIENCE_SECONDS],
    );
    const [row] = rows as { isHeld: number | bigint | null }[];
    if (Number(row?.isHeld) !== 1) throw new Error(`Another process holds the lock "${name}".`);
    return await work();
  } finally {
    await connection.end(); // Frees the lock.
  }
}
