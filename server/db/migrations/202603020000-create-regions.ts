import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE regions (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      workshop_id INT UNSIGNED NOT NULL,
      name VARCHAR(120) NOT NULL,
      itu_region TINYINT UNSIGNED NOT NULL,
      raster JSON NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      KEY regions_name (workshop_id, name),
      FOREIGN KEY (workshop_id) REFERENCES workshops (id) ON DELETE CASCADE
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE regions');
}
