import type { Run } from '../migrator.ts';

/**
 * Checks and commits wait in the table until a worker takes them. An edition without a region is
 * one that was undone: nobody sees it, and its stations are taken away bit by bit.
 */
export async function up(run: Run): Promise<void> {
  await run(`
    ALTER TABLE imports ADD COLUMN attempts TINYINT UNSIGNED NOT NULL DEFAULT 0
      COMMENT 'how many workers have taken the job' AFTER lease_until`);
  await run('ALTER TABLE editions MODIFY region_id INT UNSIGNED NULL');
}

export async function down(run: Run): Promise<void> {
  await run('DELETE FROM editions WHERE region_id IS NULL');
  await run('ALTER TABLE editions MODIFY region_id INT UNSIGNED NOT NULL');
  await run('ALTER TABLE imports DROP COLUMN attempts');
}
