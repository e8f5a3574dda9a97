import { createServer } from 'node:net';

/** How many taken ports are stepped over before giving up. */
const SPAN = 50;

/** A port nobody listens on, chosen by the system. */
export function anyFreePort(host: string): Promise<number> {
  return tryPort(host, 0);
}

/**
 * The first free port at or after the one wanted.
 * @throws {Error} When that one and the fifty after it are taken.
 */
export async function firstFreePort(host: string, wanted: number): Promise<number> {
  for (let port = wanted; port <= wanted + SPAN; port += 1) {
    if (await isFree(host, port)) return port;
  }
  throw new Error(`Ports ${wanted} to ${wanted + SPAN} on ${host} are all taken.`);
}

export async function isFree(host: string, port: number): Promise<boolean> {
  try {
    await tryPort(host, port);
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'EADDRINUSE') return false;
    throw error;
  }
}

function tryPort(host: string, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ host, port, exclusive: true }, () => {
      const address = server.address();
      const bound = typeof address === 'object' && address ? address.port : port;
      server.close(() => {
        resolve(bound);
      });
    });
  });
}
