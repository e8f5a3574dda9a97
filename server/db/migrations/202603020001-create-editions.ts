import type { Run } from '../migrator.ts';

/** An edition is a whole dated snapshot: its stations belong to it alone and never change. */
export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE editions (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      region_id INT UNSIGNED NOT NULL,
      label VARCHAR(120) NOT NULL,
      date DATE NOT NULL,
      source VARCHAR(255) NOT NULL COMMENT 'name of the file it came from',
      note TEXT NOT NULL,
      stations INT UNSIGNED NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      KEY editions_date (region_id, date, id),
      FOREIGN KEY (region_id) REFERENCES regions (id) ON DELETE CASCADE
    )`);
  await run(`
    CREATE TABLE stations (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      edition_id INT UNSIGNED NOT NULL,
      name VARCHAR(200) NOT NULL,
      call_sign VARCHAR(40) NOT NULL,
      frequency_hz INT UNSIGNED NOT NULL,
      latitude DOUBLE NULL,
      longitude DOUBLE NULL,
      power_day_w DOUBLE NULL,
      power_night_w DOUBLE NULL,
      hours VARCHAR(200) NOT NULL,
      note VARCHAR(1000) NOT NULL,
      identity CHAR(22) CHARACTER SET ascii COLLATE ascii_bin NOT NULL
        COMMENT 'equal for the same station in another edition',
      fingerprint CHAR(22) CHARACTER SET ascii COLLATE ascii_bin NOT NULL
        COMMENT 'equal where nothing changed',
      KEY stations_frequency (edition_id, frequency_hz),
      FOREIGN KEY (edition_id) REFERENCES editions (id) ON DELETE CASCADE
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE stations');
  await run('DROP TABLE editions');
}
