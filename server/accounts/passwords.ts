import { Piscina } from 'piscina';

import { UnavailableError } from '../http/errors.ts';

const THREADS = 2;
const MAX_WAITING = 200;

/** Stands in for the hash of an account that is not there, so that both take the same time. */
const NOBODY = '$2b$10$aJ1kkidavSMuTVOetcaNte/cfmuoVf4BHTl/jOBxmFxodAHED.rSm';

/** Hashes and checks passwords in a few threads of their own: it is slow on purpose. */
export class Passwords {
  private readonly pool = new Piscina({
    filename: new URL('./password-thread.mjs', import.meta.url).href,
    minThreads: 0,
    maxThreads: THREADS,
    maxQueue: MAX_WAITING,
    idleTimeout: 60_000,
  });

  hash(password: string): Promise<string> {
    return this.run('hashPassword', password);
  }

  /** Whether the password belongs to the hash; false, after the same time, where there is none. */
  async verify(password: string, passwordHash: string | undefined): Promise<boolean> {
    const task = { password, passwordHash: passwordHash ?? NOBODY };
    const isRight = await this.run<boolean>('verifyPassword', task);
    return isRight && passwordHash !== undefined;
  }

  close(): Promise<void> {
    return this.pool.close({ force: true });
  }

  private run<T>(name: string, task: unknown): Promise<T> {
    if (this.pool.queueSize >= MAX_WAITING) throw new UnavailableError();
    return this.pool.run(task, { name }) as Promise<T>;
  }
}
