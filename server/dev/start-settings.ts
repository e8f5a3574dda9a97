import { resolve } from 'node:path';

import { firstFreePort, isFree } from './free-port.ts';

const USUAL_PORT = 3000;

/** What the starter takes from the environment; everything else is the server's own to read. */
export interface StartSettings {
  readonly host: string;
  readonly port: number;
  readonly dataFolder: string;
  /** Undefined: we run a MariaDB of our own. */
  readonly databaseUrl: string | undefined;
}

/**
 * Reads the settings of a start and settles on a port.
 * @throws {Error} When PORT is no port, or is taken.
 */
export async function readStartSettings(
  environment: NodeJS.ProcessEnv,
  root: string,
  say: (line: string) => void,
): Promise<StartSettings> {
  const host = environment.HOST ?? '127.0.0.1';
  return {
    host,
    port: await choosePort(host, environment.PORT, say),
    dataFolder: resolve(root, environment.DATA_DIR ?? '.data'),
    databaseUrl: environment.DATABASE_URL,
  };
}

async function choosePort(host: string, asked: string | undefined, say: (line: string) => void) {
  if (asked === undefined || asked === '') {
    const port = await firstFreePort(host, USUAL_PORT);
    if (port !== USUAL_PORT) say(`Port ${USUAL_PORT} is taken; using ${port}.`);
    return port;
  }
  const port = Number(asked);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Error(`PORT must be a whole number from 1 to 65535, got "${asked}".`);
  }
  if (await isFree(host, port)) return port;
  throw new Error(
    `Port ${port} on ${host} is taken. Name another (PORT=${port + 1} npm start), ` +
      'or leave PORT out and the first free one is used.',
  );
}
