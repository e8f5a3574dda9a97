import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

import { type DemoSignIn, launchApi } from './api-process.ts';
import { buildClient } from './client-build.ts';
import { ensurePrograms, MARIADB } from './programs.ts';
import { keepSecret } from './secret.ts';
import { ownDatabase } from './start-database.ts';
import { choosePort, readStartSettings, type StartSettings } from './start-settings.ts';
import { Supervisor, type Ward } from './supervisor.ts';

const root = resolve(fileURLToPath(new URL('../..', import.meta.url)));

const API_GRACE_MS = 15_000;

const say = (line: string): void => {
  console.log(line);
};

/** What has to be ended when we end, in the order in which it was started. */
const running: (() => Promise<void>)[] = [];
let ending: Promise<never> | undefined;

/** Brings up database, client and API, says where they are, and keeps them running. */
export async function start(environment: NodeJS.ProcessEnv): Promise<void> {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) {
    process.on(signal, () => void end(0));
  }
  process.on('disconnect', () => void end(0));
  try {
    await bringUp(environment);
  } catch (error) {
    fail(error instanceof Error ? error : new Error(String(error)));
  }
}

async function bringUp(environment: NodeJS.ProcessEnv): Promise<void> {
  const began = performance.now();
  const settings = readStartSettings(environment, root);
  mkdirSync(settings.dataFolder, { recursive: true, mode: 0o700 });
  if (settings.databaseUrl === undefined) ensurePrograms([MARIADB], say);
  const client = buildClient(root, say);
  running.push(client.stop);
  const [database] = await Promise.all([ensureDatabase(settings), client.done]);
  const port = await choosePort(settings, say);
  const apiEnvironment = {
    ...environment,
    ...keptSecrets(environment, settings.dataFolder),
    HOST: settings.host,
    PORT: String(port),
    DATABASE_URL: database,
    DATA_DIR: settings.dataFolder,
    CLIENT_DIR: client.folder,
  };
  const demo = await startApi(settings, apiEnvironment);
  announce(addressOf(settings.host, port), demo, performance.now() - began);
}

/** Secrets of this installation, unless the environment brings its own. */
function keptSecrets(environment: NodeJS.ProcessEnv, folder: string): NodeJS.ProcessEnv {
  const session = {
    SESSION_SECRET: environment.SESSION_SECRET ?? keepSecret(folder, 'session-key'),
  };
  if (environment.NODE_ENV === 'production') return session;
  return {
    ...session,
    DEMO_CLUB: '1',
    DEMO_PASSWORD: environment.DEMO_PASSWORD ?? keepSecret(folder, 'demo-password', 9),
  };
}

/** Address of the user's own server, or of ours once it runs. */
async function ensureDatabase(settings: StartSettings): Promise<string> {
  if (settings.databaseUrl !== undefined) {
    say('Using the database named by DATABASE_URL.');
    return settings.databaseUrl;
  }
  const { ward, url } = ownDatabase(settings.dataFolder, say);
  await supervise(ward);
  return url();
}

async function startApi(settings: StartSettings, environment: NodeJS.ProcessEnv) {
  const logFile = join(settings.dataFolder, 'server.log');
  let demo: readonly DemoSignIn[] = [];
  const launch = () =>
    launchApi({ root, logFile, environment }, (message) => {
      demo = message.demo ?? [];
    });
  await supervise({ name: 'The API server', launch, graceMs: API_GRACE_MS });
  say(`The server logs to ${logFile}.`);
  return demo;
}

async function supervise(ward: Ward): Promise<void> {
  const supervisor = new Supervisor(ward, say, fail);
  running.push(() => supervisor.stop());
  await supervisor.start();
}

function addressOf(host: string, port: number): string {
  const isHere = ['127.0.0.1', '::1', '0.0.0.0', '::'].includes(host);
  return `http://${isHere ? 'localhost' : host}:${port}`;
}

function announce(url: string, demo: readonly DemoSignIn[], tookMs: number): void {
  say(`Ready after ${(tookMs / 1000).toFixed(1)} s.`);
  say('');
  say(`  Fallow is at ${url}`);
  if (demo.length > 0) say('  Demo sign-ins:');
  for (const { role, email, password } of demo) {
    say(`    ${role.padEnd(10)} ${email}  ${password}`);
  }
  say('');
  say('Ctrl-C stops it; the data stay.');
  process.send?.({ type: 'ready', url, demo });
}

function fail(error: Error): void {
  if (ending) return;
  console.error(error.message);
  void end(1);
}

/** Ends everything, the last started first. Asked twice, it goes on with the first. */
function end(code: number): Promise<never> {
  ending ??= (async () => {
    if (code === 0) say('Stopping.');
    for (const stop of running.toReversed()) await stop();
    process.exit(code);
  })();
  return ending;
}
