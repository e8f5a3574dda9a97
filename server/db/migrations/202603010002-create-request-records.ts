import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE request_counters (
      name VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      spent INT UNSIGNED NOT NULL,
      ends_at DATETIME(3) NOT NULL,
      KEY request_counters_end (ends_at)
    )`);
  await run(`
    CREATE TABLE idempotency_keys (
      account_id INT UNSIGNED NOT NULL,
      route VARCHAR(120) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      key_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      body_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      answer JSON NULL,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (account_id, route, key_hash),
      KEY idempotency_keys_created (created_at),
      FOREIGN KEY (account_id) REFERENCES accounts (id) ON DELETE CASCADE
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE idempotency_keys');
  await run('DROP TABLE request_counters');
}
