import { endProcess, exitOf, spawnBound } from '../../server/dev/bound-process.ts';

const GRACE_MS = 15_000;

/** What follows a step is not to happen once the run was stopped: the process ends instead. */
const FOREVER = new Promise<never>(() => undefined);

/** One program of the gate: what it is called, and how it is run. */
export interface Step {
  readonly name: string;
  /** A program of a package, as the path of its script under node_modules. */
  readonly script: string;
  readonly args: readonly string[];
}

export interface Finished {
  readonly exitCode: number;
  readonly output: string;
  readonly seconds: number;
}

/** Runs steps from the root of the checkout, and ends the one that runs when told to stop. */
export class StepRunner {
  private isStopping = false;
  private readonly running = new Set<() => Promise<void>>();
  private readonly root: string;
  private readonly environment: NodeJS.ProcessEnv;

  constructor(root: string, environment: NodeJS.ProcessEnv) {
    this.root = root;
    this.environment = environment;
  }

  /** @param isLoud Whether the output goes straight to the terminal instead of being kept. */
  async run({ script, args }: Step, isLoud: boolean): Promise<Finished> {
    const began = performance.now();
    const child = spawnBound(process.execPath, [`node_modules/${script}`, ...args], {
      cwd: this.root,
      env: this.environment,
      stdio: isLoud ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe'],
    });
    const stop = () => endProcess(child, GRACE_MS);
    this.running.add(stop);
    const output: string[] = [];
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (text: string) => output.push(text));
    }
    await exitOf(child);
    this.running.delete(stop);
    if (this.isStopping) await FOREVER;
    const seconds = (performance.now() - began) / 1000;
    return { exitCode: child.exitCode ?? 1, output: output.join(''), seconds };
  }

  async stop(): Promise<void> {
    this.isStopping = true;
    await Promise.all([...this.running].map((stop) => stop()));
  }
}
