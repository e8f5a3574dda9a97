import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../..', import.meta.url));

/**
 * Installs the packages of the lock file when they are missing or differ from it. Plain JavaScript,
 * because nothing else can run before.
 */
export function installPackages() {
  if (isInstalled()) return;
  console.log('Installing the packages of package-lock.json (about a minute the first time).');
  const { status, error } = runBound('npm', 'ci', '--include=dev', '--loglevel=error');
  if (status === 0) return;
  console.error(`The packages could not be installed${error ? `: ${error.message}` : ''}.`);
  console.error('Run "npm ci --include=dev" here to see why, then start again.');
  process.exit(1);
}

/** Runs a program that ends when we are killed, so that two installations never mix. */
function runBound(...command) {
  const options = { cwd: root, stdio: 'inherit' };
  const bound = spawnSync('setpriv', ['--pdeathsig', 'SIGTERM', '--', ...command], options);
  return bound.error ? spawnSync(command[0], command.slice(1), options) : bound;
}

/** npm leaves in node_modules a list of what it has installed there, in the lock file's own shape. */
function isInstalled() {
  const wanted = readPackages('package-lock.json');
  const present = readPackages('node_modules/.package-lock.json');
  return Object.entries(wanted ?? {}).every(
    ([path, { version, optional }]) =>
      path === '' || optional || present?.[path]?.version === version,
  );
}

function readPackages(path) {
  try {
    return JSON.parse(readFileSync(new URL(path, `file://${root}`), 'utf8')).packages;
  } catch {
    return undefined;
  }
}
