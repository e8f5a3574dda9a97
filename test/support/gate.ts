import type { Counts } from './counts.ts';
import type { Step, StepRunner } from './step.ts';

const typescript = (project: string): Step => ({
  name: `types of ${project}`,
  script: 'typescript/bin/tsc',
  args: ['--project', project],
});

/** What is true of the sources before any test runs, the quickest answers first. */
const GATE: readonly Step[] = [
  {
    name: 'format',
    script: 'prettier/bin/prettier.cjs',
    args: ['--check', '--log-level', 'warn', '.'],
  },
  {
    name: 'import rules',
    script: 'dependency-cruiser/bin/dependency-cruise.mjs',
    args: ['--config', '.dependency-cruiser.cjs', 'src', 'server', 'shared', 'test'],
  },
  typescript('shared'),
  typescript('server'),
  typescript('test'),
  {
    name: 'types of src',
    script: '@angular/compiler-cli/bundles/src/bin/ngc.js',
    args: ['--project', 'src/tsconfig.spec.json', '--noEmit'],
  },
  { name: 'lint', script: 'eslint/bin/eslint.js', args: ['--max-warnings', '0', '.'] },
];

/** Runs every step, also after one has failed: each failure is worth knowing. */
export async function runGate(runner: StepRunner, say: (line: string) => void): Promise<Counts> {
  let failed = 0;
  for (const step of GATE) {
    const { exitCode, output, seconds } = await runner.run(step, false);
    say(`${step.name.padEnd(16)} ${exitCode === 0 ? 'passed' : 'FAILED'} ${seconds.toFixed(1)} s`);
    if (exitCode === 0) continue;
    failed += 1;
    say(output.trimEnd());
  }
  return { passed: GATE.length - failed, failed, skipped: 0 };
}
