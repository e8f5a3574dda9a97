import type { Run } from '../migrator.ts';

/** Corrections by hand belong to the region: they outlive every edition of its list. */
export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE corrections (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      region_id INT UNSIGNED NOT NULL,
      author_id INT UNSIGNED NULL,
      kind ENUM('added', 'changed', 'off-air', 'heard') NOT NULL,
      identity CHAR(22) CHARACTER SET ascii COLLATE ascii_bin NOT NULL
        COMMENT 'of the station it is about; + and an id: of the correction that added it',
      station JSON NOT NULL COMMENT 'the station as it was listed, or as it was added',
      fields JSON NULL COMMENT 'what is changed of a listed station',
      note TEXT NOT NULL,
      date DATE NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      KEY corrections_kind (region_id, kind, id),
      FOREIGN KEY (region_id) REFERENCES regions (id) ON DELETE CASCADE,
      FOREIGN KEY (author_id) REFERENCES accounts (id) ON DELETE SET NULL
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE corrections');
}
