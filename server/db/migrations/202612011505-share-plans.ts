import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    ALTER TABLE plans
      ADD COLUMN working JSON NULL COMMENT 'stations and responses with the chosen IF' AFTER snapshot`);
  await run(`
    CREATE TABLE plan_shares (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      plan_id INT UNSIGNED NULL COMMENT 'null: the plan is deleted',
      workshop_id INT UNSIGNED NOT NULL,
      token_hash CHAR(43) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      shared_by INT UNSIGNED NOT NULL,
      shared_at DATETIME(3) NOT NULL,
      revoked_by INT UNSIGNED NULL,
      revoked_at DATETIME(3) NULL,
      UNIQUE KEY plan_shares_token (token_hash),
      KEY plan_shares_plan (plan_id, revoked_at),
      FOREIGN KEY (plan_id) REFERENCES plans (id) ON DELETE SET NULL,
      FOREIGN KEY (workshop_id) REFERENCES workshops (id) ON DELETE CASCADE,
      FOREIGN KEY (shared_by) REFERENCES accounts (id),
      FOREIGN KEY (revoked_by) REFERENCES accounts (id)
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE plan_shares');
  await run('ALTER TABLE plans DROP COLUMN working');
}
