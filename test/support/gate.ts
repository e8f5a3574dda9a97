import type { Counts } from './counts.ts';
import type { Step, StepRunner } from './step.ts';

const typescript = (project: string): Step => ({
  name: `types of ${project}`,
  script: 'typescript/bin/tsc',
  args: ['--project', project],
});

const LINT: Step = {
  name: 'lint',
  script: 'eslint/bin/eslint.js',
  args: ['--max-warnings', '0', '.'],
};

const OTHERS: readonly Step[] = [
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
];

/**
 * What is true of the sources before any test runs. The lint takes as long as all the others
 * together, so it goes beside them. Each step runs also after one has failed.
 */
export async function runGate(runner: StepRunner, say: (line: string) => void): Promise<Counts> {
  const inTurn = async (steps: readonly Step[]): Promise<readonly boolean[]> => {
    const passed: boolean[] = [];
    for (const step of steps) passed.push(await check(runner, step, say));
    return passed;
  };
  const results = (await Promise.all([inTurn([LINT]), inTurn(OTHERS)])).flat();
  const failed = results.filter((passed) => !passed).length;
  return { passed: results.length - failed, failed, skipped: 0 };
}

async function check(runner: StepRunner, step: Step, say: (line: string) => void) {
  const { exitCode, output, seconds } = await runner.run(step, false);
  const passed = exitCode === 0;
  say(`${step.name.padEnd(16)} ${passed ? 'passed' : 'FAILED'} ${seconds.toFixed(1)} s`);
  if (!passed) say(output.trimEnd());
  return passed;
}
