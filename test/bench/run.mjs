/**
 * `npm run bench`: runs every benchmark beside this file, each in a process of its own, and prints
 * its lines: what was measured and its aim. A benchmark exports `run()`, which answers verdicts; one
 * that is far off its aim fails the run. Names given on the command line choose among them.
 */
import { spawnSync } from 'node:child_process';
import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const here = new URL('.', import.meta.url);
const asked = process.argv.slice(2);
const benches = readdirSync(here)
  .filter((name) => name.endsWith('.bench.ts'))
  .filter((name) => asked.length === 0 || asked.some((part) => name.includes(part)));

for (const bench of benches) {
  console.log(`\n${bench.replace('.bench.ts', '')}`);
  const script = fileURLToPath(new URL('run-one.mjs', here));
  const { status } = spawnSync(
    process.execPath,
    ['--expose-gc', '--import', 'tsx', script, new URL(bench, here).href],
    { stdio: 'inherit', cwd: fileURLToPath(new URL('../..', here)) },
  );
  if (status !== 0) process.exitCode = 1;
}
