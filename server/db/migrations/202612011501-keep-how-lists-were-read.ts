import type { Run } from '../migrator.ts';

/** What a check found beside its counts, and by which headers a matching is recognised again. */
export async function up(run: Run): Promise<void> {
  await run(`
    ALTER TABLE imports
      ADD COLUMN findings JSON NULL COMMENT 'causes and remarks of the check' AFTER faults,
      ADD COLUMN header_key CHAR(22) CHARACTER SET ascii COLLATE ascii_bin NULL
        COMMENT 'equal for files with the same column headers' AFTER stored_name,
      ADD KEY imports_headers (region_id, header_key, id)`);
  await run(`
    UPDATE imports SET reading = JSON_SET(reading, '$.headerLine', 1, '$.dataLine', 2,
      '$.letterO', NULL, '$.addsTo', NULL)`);
}

export async function down(run: Run): Promise<void> {
  // The key for the regions must not be lost with ours: it may be the only one there is.
  await run('ALTER TABLE imports ADD KEY imports_region (region_id)');
  await run(`
    ALTER TABLE imports DROP KEY imports_headers, DROP COLUMN header_key, DROP COLUMN findings`);
}
