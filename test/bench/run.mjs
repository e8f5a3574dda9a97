/**
 * `npm run bench`: runs every benchmark beside this file, each in a process of its own, and prints
 * its lines. A benchmark exports `run()`, which answers lines of text. Names given on the command
 * line choose among them.
 */
import { spawnSync } from 'node:child_process';
import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const here = new URL('.', import.meta.url);
const asked = process.argv.slice(2);
const benches = readdirSync(here)
  .filter((name) => name.endsWith('.bench.ts'))
  .filter((name) => asked.length === 0 || asked.some((part) => name.includes(part)));

let failed = 0;
for (const bench of benches) {
  console.log(`\n${bench.replace('.bench.ts', '')}`);
  const script = `const { run } = await import(${JSON.stringify(new URL(bench, here).href)});
    for (const line of await run()) console.log('  ' + line);`;
  const { status } = spawnSync(
    process.execPath,
    ['--expose-gc', '--import', 'tsx', '--input-type=module', '--eval', script],
    { stdio: 'inherit', cwd: fileURLToPath(new URL('../..', here)) },
  );
  if (status !== 0) failed++;
}
if (failed > 0) process.exitCode = 1;
