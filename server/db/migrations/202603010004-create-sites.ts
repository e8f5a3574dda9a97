import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE sites (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      workshop_id INT UNSIGNED NOT NULL,
      owner_id INT UNSIGNED NOT NULL,
      name VARCHAR(120) NOT NULL,
      latitude DOUBLE NULL,
      longitude DOUBLE NULL,
      ground ENUM('sea', 'wet', 'average', 'dry', 'poor') NULL,
      noise ENUM('city', 'residential', 'rural', 'quiet') NULL,
      indoors BOOLEAN NOT NULL,
      noise_floor_db DOUBLE NULL,
      itu_region TINYINT UNSIGNED NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      KEY sites_name (workshop_id, name),
      FOREIGN KEY (workshop_id) REFERENCES workshops (id) ON DELETE CASCADE,
      FOREIGN KEY (owner_id) REFERENCES accounts (id)
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE sites');
}
