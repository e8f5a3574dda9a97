import type { Run } from '../migrator.ts';

/** Rasters each hold from a date; what was there holds from ever. */
export async function up(run: Run): Promise<void> {
  await run('ALTER TABLE regions ADD rasters JSON NULL AFTER raster');
  await run(`UPDATE regions SET rasters =
    JSON_ARRAY(JSON_OBJECT('from', NULL, 'ranges', JSON_QUERY(raster, '$')))`);
  await run('ALTER TABLE regions MODIFY rasters JSON NOT NULL, DROP raster');
}

export async function down(run: Run): Promise<void> {
  await run('ALTER TABLE regions ADD raster JSON NULL AFTER rasters');
  await run("UPDATE regions SET raster = JSON_QUERY(rasters, '$[last].ranges')");
  await run('ALTER TABLE regions MODIFY raster JSON NOT NULL, DROP rasters');
}
