import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE plans (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      receiver_id INT UNSIGNED NOT NULL,
      owner_id INT UNSIGNED NOT NULL,
      site_id INT UNSIGNED NULL,
      edition_id INT UNSIGNED NULL,
      name VARCHAR(120) NOT NULL,
      if_hz INT UNSIGNED NOT NULL,
      snapshot JSON NOT NULL COMMENT 'receiver, site and results as they were when kept',
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      KEY plans_receiver (receiver_id, created_at),
      FOREIGN KEY (receiver_id) REFERENCES receivers (id) ON DELETE CASCADE,
      FOREIGN KEY (owner_id) REFERENCES accounts (id),
      FOREIGN KEY (site_id) REFERENCES sites (id) ON DELETE SET NULL,
      FOREIGN KEY (edition_id) REFERENCES editions (id) ON DELETE SET NULL
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE plans');
}
