import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE imports (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      region_id INT UNSIGNED NOT NULL,
      state ENUM('uploaded', 'checking', 'ready', 'committing', 'committed', 'failed', 'cancelled',
        'undone') NOT NULL,
      file_name VARCHAR(255) NOT NULL COMMENT 'as the user calls it',
      stored_name CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL COMMENT 'as we call it',
      reading JSON NOT NULL COMMENT 'encoding, delimiter, decimal mark, columns',
      sample JSON NOT NULL,
      label VARCHAR(120) NULL,
      date DATE NULL,
      counts JSON NULL,
      faults JSON NULL,
      base_edition_id INT UNSIGNED NULL COMMENT 'the edition the counts were made against',
      edition_id INT UNSIGNED NULL,
      committing_region_id INT UNSIGNED NULL COMMENT 'the region while committing: one at a time',
      worker CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL COMMENT 'who checks or commits',
      lease_until DATETIME(3) NULL COMMENT 'when that worker counts as dead',
      progress DOUBLE NOT NULL,
      reason VARCHAR(500) NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      UNIQUE KEY imports_committing (committing_region_id),
      KEY imports_lease (state, lease_until),
      FOREIGN KEY (region_id) REFERENCES regions (id) ON DELETE CASCADE,
      FOREIGN KEY (edition_id) REFERENCES editions (id) ON DELETE SET NULL
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE imports');
}
