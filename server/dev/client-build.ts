import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';

import { endProcess, exitOf, spawnBound } from './bound-process.ts';

/** What the client is made of, seen from the root of the checkout. */
const SOURCES = ['src', 'shared', 'datasets', 'angular.json', 'tsconfig.json', 'package-lock.json'];
const BUILT_FROM = /\.(ts|html|scss|css|json|svg|ico|woff2)$/;

export interface ClientBuild {
  readonly folder: string;
  /** Settles when the folder holds the client of the present sources. */
  readonly done: Promise<void>;
  readonly stop: () => Promise<void>;
}

/** Builds the client when its sources differ from those of the last good build. */
export function buildClient(root: string, say: (line: string) => void): ClientBuild {
  const folder = join(root, 'dist/client');
  const stamp = join(root, 'dist/client.sources');
  const sources = fingerprint(root);
  if (existsSync(join(folder, 'index.html')) && readStamp(stamp) === sources) {
    return { folder, done: Promise.resolve(), stop: () => Promise.resolve() };
  }
  say('Building the client (half a minute the first time).');
  const ng = join(root, 'node_modules/@angular/cli/bin/ng.js');
  const build = spawnBound(process.execPath, [ng, 'build'], {
    cwd: root,
    env: { ...process.env, NG_CLI_ANALYTICS: 'false' },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const output: string[] = [];
  for (const stream of [build.stdout, build.stderr]) {
    stream?.setEncoding('utf8').on('data', (text: string) => output.push(text));
  }
  const done = exitOf(build).then(() => {
    if (build.exitCode !== 0) throw new Error(`The client could not be built:\n${output.join('')}`);
    mkdirSync(dirname(stamp), { recursive: true });
    writeFileSync(stamp, sources);
    say('The client is built.');
  });
  return { folder, done, stop: () => endProcess(build, 2_000) };
}

/** One figure for all the sources: it changes when any file's name or content does. */
export function fingerprint(root: string): string {
  const hash = createHash('sha256');
  for (const source of SOURCES) {
    for (const path of filesUnder(root, source)) {
      hash
        .update(`${path}\0`)
        .update(readFileSync(join(root, path)))
        .update('\0');
    }
  }
  return hash.digest('hex');
}

function filesUnder(root: string, path: string): readonly string[] {
  if (!existsSync(join(root, path))) return [];
  if (!statSync(join(root, path)).isDirectory()) return [path];
  return readdirSync(join(root, path), { withFileTypes: true, recursive: true })
    .filter(
      (entry) => entry.isFile() && BUILT_FROM.test(entry.name) && !entry.name.endsWith('.spec.ts'),
    )
    .map((entry) => join(entry.parentPath, entry.name).slice(root.length).replace(/^\//, ''))
    .sort();
}

function readStamp(path: string): string | undefined {
  return existsSync(path) ? readFileSync(path, 'utf8') : undefined;
}
