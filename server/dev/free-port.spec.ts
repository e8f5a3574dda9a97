import { createServer, type Server } from 'node:net';

import { afterEach, beforeEach, describe, expect, it } from 'vitest';

import { anyFreePort, firstFreePort, isFree } from './free-port.ts';
import { choosePort, readStartSettings } from './start-settings.ts';

const HOST = '127.0.0.1';

describe('ports', () => {
  let taken: number;
  let holder: Server;

  beforeEach(async () => {
    taken = await anyFreePort(HOST);
    holder = createServer();
    await new Promise<void>((resolve) => holder.listen(taken, HOST, resolve));
  });

  afterEach(() => {
    holder.close();
  });

  it('a port somebody listens on is not free', async () => {
    expect(await isFree(HOST, taken)).toBe(false);
  });

  it('a taken port is stepped over', async () => {
    const port = await firstFreePort(HOST, taken);

    expect(port).toBeGreaterThan(taken);
    expect(await isFree(HOST, port)).toBe(true);
  });

  it('a taken port that was asked for by name is named, with another to try', async () => {
    const choosing = choosePort({ host: HOST, port: taken }, () => undefined);

    await expect(choosing).rejects.toThrow(`Port ${taken} on 127.0.0.1 is taken. Name another`);
  });

  it('a PORT that is no port is refused with what would be right', () => {
    const reading = () => readStartSettings({ PORT: '70000' }, '/');

    expect(reading).toThrow('PORT must be a whole number from 1 to 65535, got "70000"');
  });
});
