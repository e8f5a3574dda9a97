import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    CREATE TABLE receivers (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      workshop_id INT UNSIGNED NOT NULL,
      owner_id INT UNSIGNED NOT NULL,
      name VARCHAR(120) NOT NULL,
      if_hz INT UNSIGNED NOT NULL,
      definition JSON NOT NULL,
      version INT UNSIGNED NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      KEY receivers_name (workshop_id, name),
      KEY receivers_updated (workshop_id, updated_at),
      FOREIGN KEY (workshop_id) REFERENCES workshops (id) ON DELETE CASCADE,
      FOREIGN KEY (owner_id) REFERENCES accounts (id)
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE receivers');
}
