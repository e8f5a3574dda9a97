import { resolve } from 'node:path';

import { firstFreePort, isFree } from './free-port.ts';

const USUAL_PORT = 3000;

/** What the starter takes from the environment; everything else is the server's own to read. */
export interface StartSettings {
  readonly host: string;
  /** Undefined: the first free port from the usual one on. */
  readonly port: number | undefined;
  readonly dataFolder: string;
  /** Undefined: we run a MariaDB of our own. */
  readonly databaseUrl: string | undefined;
}

/** @throws {Error} When PORT is no port. */
export function readStartSettings(environment: NodeJS.ProcessEnv, root: string): StartSettings {
  return {
    host: environment.HOST ?? '127.0.0.1',
    port: readPort(environment.PORT),
    dataFolder: resolve(root, environment.DATA_DIR ?? '.data'),
    databaseUrl: environment.DATABASE_URL,
  };
}

function readPort(text: string | undefined): number | undefined {
  if (text === undefined || text === '') return undefined;
  const port = Number(text);
  if (Number.isInteger(port) && port >= 1 && port <= 65_535) return port;
  throw new Error(`PORT must be a whole number from 1 to 65535, got "${text}".`);
}

/**
 * Settles on the port to serve on, as late as can be: somebody else may take it meanwhile.
 * @throws {Error} When the port asked for is taken.
 */
export async function choosePort(
  { host, port }: Pick<StartSettings, 'host' | 'port'>,
  say: (line: string) => void,
): Promise<number> {
  if (port === undefined) {
    const free = await firstFreePort(host, USUAL_PORT);
    if (free !== USUAL_PORT) say(`Port ${USUAL_PORT} is taken; using ${free}.`);
    return free;
  }
  if (await isFree(host, port)) return port;
  throw new Error(
    `Port ${port} on ${host} is taken. Name another (PORT=${port + 1} npm start), ` +
      'or leave PORT out and the first free one is used.',
  );
}
