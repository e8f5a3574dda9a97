import { afterEach, describe, expect, it } from 'vitest';

import { receiverDraft } from '../../shared/contracts/receiver.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import { USUAL_SKY_WAVE } from '../../shared/radio/propagation/sky-wave.ts';
import type { Station } from '../../shared/radio/station.ts';
import { Engine } from './engine.ts';
import type { ListAtSite, Tasks } from './engine-tasks.ts';
import { packStations } from './station-columns.ts';

let engine: Engine;
afterEach(() => engine.close());

const stations = (count: number): Station[] =>
  Array.from({ length: count }, (_, id) => ({
    id,
    name: `Station ${id}`,
    frequencyHz: 150_000 + 90 * id,
    latitude: null,
    longitude: null,
    powerDayW: null,
    powerNightW: null,
    fieldDb: 60 + (id % 30),
  }));

const listOf = async (count: number): Promise<ListAtSite> => ({
  site: {
    latitude: null,
    longitude: null,
    ground: null,
    noise: 'rural',
    indoors: false,
    noiseFloorDb: null,
    ituRegion: 1,
  },
  raster: defaultRaster(1),
  columns: await packStations(stations(count)),
  content: null,
  kept: null,
});

const receiver = receiverDraft.parse({
  ifHz: 455_000,
  selectivity: { kind: 'widths', b6Hz: 6000, b60Hz: 22_000 },
  bands: [{ name: 'MW', lowHz: 550_000, highHz: 1_600_000, oscillator: 'above' }],
});

const task = async (count: number): Promise<Tasks['assess']['takes']> => ({
  list: await listOf(count),
  time: 'night',
  skyWave: USUAL_SKY_WAVE,
  ask: { receiver, maxM: 3, maxN: 2, leaveOutBetterThan: null, limit: 10_000 },
});

const manyCandidates = async (
  count: number,
  candidates = 400,
): Promise<Tasks['judgeCandidates']['takes']> => ({
  lists: [await listOf(count)],
  ask: {
    receiver,
    periods: ['night'],
    fromHz: 450_000,
    toHz: 450_000 + 50 * (candidates - 1),
    stepHz: 50,
    maxM: 3,
    maxN: 2,
  },
});

describe('Engine', () => {
  it('computes in a thread and answers JSON that can be read', async () => {
    engine = new Engine();

    const answer = await engine.run('fieldStrengths', {
      list: await listOf(3),
      time: 'day',
      skyWave: USUAL_SKY_WAVE,
    });

    expect(new TextDecoder().decode(answer.json)).toBe(JSON.stringify(answer.read()));
    expect(answer.read().fields[2]).toMatchObject({ station: 2, name: 'Station 2', fieldDb: 62 });
  });

  it('leaves the event loop free while it computes', async () => {
    engine = new Engine();
    await engine.run('assess', await task(1));
    const begun = performance.now();
    let last = begun;
    let longest = 0;
    const turn = () => {
      longest = Math.max(longest, performance.now() - last);
      last = performance.now();
    };
    const timer = setInterval(turn, 1);

    await engine.run('assess', await task(5000));
    turn();
    clearInterval(timer);

    // Were it computed on the loop, one gap would be nearly the whole time.
    expect(longest).toBeLessThan((performance.now() - begun) / 2);
  });

  it('drops what waits when its client leaves', async () => {
    engine = new Engine();
    const each = await task(1000);
    const busy = Array.from({ length: 8 }, () => engine.run('assess', each));
    const leaving = new AbortController();
    const waiting = engine.run('assess', each, { signal: leaving.signal });

    leaving.abort();

    await expect(waiting).rejects.toMatchObject({ status: 503 });
    await Promise.all(busy);
  });

  it('stops what runs when its client leaves, long before it would have been done', async () => {
    engine = new Engine();
    await engine.run('assess', await task(1));
    const costly = await manyCandidates(1500);
    const leaving = new AbortController();
    const begun = performance.now();
    const whole = await engine.run('judgeCandidates', costly).then(() => performance.now() - begun);
    const stoppedAt = performance.now();
    const running = engine.run('judgeCandidates', costly, { signal: leaving.signal });

    setTimeout(() => leaving.abort(), whole / 10);
    await expect(running).rejects.toMatchObject({ status: 503 });

    expect(performance.now() - stoppedAt).toBeLessThan(whole / 2);
    expect((await engine.run('assess', await task(1))).read().bands).toHaveLength(1);
  });

  it('refuses what is far too much before it begins, and says what to leave out', async () => {
    engine = new Engine();
    const refused = engine.run('judgeCandidates', await manyCandidates(20_000));

    await expect(refused).rejects.toMatchObject({
      status: 400,
      type: 'too-costly',
      issues: [
        { path: 'stepHz', message: expect.stringContaining('400 candidates') },
        { path: 'stations', message: expect.stringContaining('closer than the channels') },
      ],
    });
  });

  it('stops what takes longer than the limit, says so, and goes on', async () => {
    engine = new Engine(3000);
    await engine.run('assess', await task(1));

    await expect(
      engine.run('judgeCandidates', await manyCandidates(10_000, 100)),
    ).rejects.toMatchObject({
      status: 400,
      type: 'too-costly',
      issues: [], // Ended by the clock: what is refused before it begins says what to leave out.
    });
    expect((await engine.run('assess', await task(1))).read().bands).toHaveLength(1);
  });

  it('keeps the threads of members free however much visitors ask', async () => {
    engine = new Engine();
    const costly = await manyCandidates(1000, 50);
    await engine.run('assess', await task(1));
    const done: string[] = [];
    const visitors = Array.from({ length: 4 }, () =>
      engine.run('judgeCandidates', costly, { isVisitor: true }).then(
        () => done.push('visitor'),
        () => done.push('visitor'),
      ),
    );

    await engine.run('assess', await task(1)).then(() => done.push('member'));
    await Promise.all(visitors);

    expect(done.indexOf('member')).toBeLessThanOrEqual(1);
  });
});
