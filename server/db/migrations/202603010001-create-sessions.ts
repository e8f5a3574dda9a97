import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE sessions (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      account_id INT UNSIGNED NOT NULL,
      workshop_id INT UNSIGNED NOT NULL,
      created_at DATETIME(3) NOT NULL,
      seen_at DATETIME(3) NOT NULL,
      KEY sessions_seen (seen_at),
      FOREIGN KEY (account_id, workshop_id)
        REFERENCES memberships (account_id, workshop_id) ON DELETE CASCADE
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE sessions');
}
