import type { Run } from '../migrator.ts';

export async function up(run: Run): Promise<void> {
  await run(`
    ALTER TABLE stations ADD COLUMN pattern_db VARCHAR(300) CHARACTER SET ascii NULL
      COMMENT '36 gains in dB every 10 degrees from north, joined by commas' AFTER power_night_w`);
}

export async function down(run: Run): Promise<void> {
  await run('ALTER TABLE stations DROP COLUMN pattern_db');
}
