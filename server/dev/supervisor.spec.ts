import type { ChildProcess } from 'node:child_process';

import { afterEach, describe, expect, it, vi } from 'vitest';

import { isRunning, spawnBound } from './bound-process.ts';
import { Supervisor } from './supervisor.ts';

describe('a supervised process', () => {
  const launched: ChildProcess[] = [];
  const giveUp = vi.fn();
  const say = vi.fn();

  const launch = () => {
    const child = spawnBound('sleep', ['60'], { stdio: 'ignore' });
    launched.push(child);
    return Promise.resolve(child);
  };
  const supervisor = () => new Supervisor({ name: 'Sleeper', launch, graceMs: 2_000 }, say, giveUp);

  afterEach(() => {
    for (const child of launched.splice(0)) child.kill('SIGKILL');
    vi.clearAllMocks();
  });

  it('runs again after it was killed', async () => {
    const watched = supervisor();
    await watched.start();

    launched[0]?.kill('SIGKILL');

    await vi.waitFor(() => {
      expect(say).toHaveBeenCalledWith('Sleeper runs again.');
    });
    expect(launched).toHaveLength(2);
    await watched.stop();
  });

  it('is given up when it dies three times within a minute', async () => {
    const watched = supervisor();
    await watched.start();

    for (const death of [1, 2, 3]) {
      await vi.waitFor(() => {
        expect(launched).toHaveLength(death);
      });
      launched[death - 1]?.kill('SIGKILL');
    }

    await vi.waitFor(() => {
      expect(giveUp).toHaveBeenCalledOnce();
    });
    expect(launched).toHaveLength(3);
  });

  it('stays down once it was stopped', async () => {
    const watched = supervisor();
    await watched.start();

    await watched.stop();

    expect(launched.map(isRunning)).toEqual([false]);
    expect(say).not.toHaveBeenCalled();
  });
});
