import type { Run } from '../migrator.ts';

/** What stations are sorted and compared by; the greater of both powers, -1 where none is known. */
export async function up(run: Run): Promise<void> {
  await run(`
    ALTER TABLE stations
      ADD power_w DOUBLE AS (
        COALESCE(GREATEST(power_day_w, power_night_w), power_day_w, power_night_w, -1)) VIRTUAL,
      ADD KEY stations_name (edition_id, name, id),
      ADD KEY stations_power (edition_id, power_w, id),
      ADD KEY stations_identity (edition_id, identity, fingerprint)`);
}

export async function down(run: Run): Promise<void> {
  await run(`
    ALTER TABLE stations
      DROP KEY stations_name,
      DROP KEY stations_power,
      DROP KEY stations_identity,
      DROP COLUMN power_w`);
}
