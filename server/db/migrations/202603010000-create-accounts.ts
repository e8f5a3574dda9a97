import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  // A server of the user's own may be set to another character set.
  await run('ALTER DATABASE CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci');
  await run(`
    CREATE TABLE workshops (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      name VARCHAR(160) NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL
    )`);
  await run(`
    CREATE TABLE accounts (
      id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      email VARCHAR(254) NOT NULL,
      name VARCHAR(120) NOT NULL,
      password_hash CHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      workshop_id INT UNSIGNED NOT NULL COMMENT 'where the next session begins',
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      UNIQUE KEY accounts_email (email),
      FOREIGN KEY (workshop_id) REFERENCES workshops (id)
    )`);
  await run(`
    CREATE TABLE memberships (
      account_id INT UNSIGNED NOT NULL,
      workshop_id INT UNSIGNED NOT NULL,
      role ENUM('member', 'librarian', 'admin') NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      PRIMARY KEY (account_id, workshop_id),
      KEY memberships_workshop (workshop_id),
      FOREIGN KEY (account_id) REFERENCES accounts (id) ON DELETE CASCADE,
      FOREIGN KEY (workshop_id) REFERENCES workshops (id) ON DELETE CASCADE
    )`);
}

export async function down(run: Run): Promise<void> {
  await run('DROP TABLE memberships');
  await run('DROP TABLE accounts');
  await run('DROP TABLE workshops');
}
