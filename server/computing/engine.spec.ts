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
    const waiting = engine.run('assess', each, leaving.signal);

    leaving.abort();

    await expect(waiting).rejects.toMatchObject({ status: 503 });
    await Promise.all(busy);
  });

  it('ends what takes far too long, says so, and goes on', async () => {
    engine = new Engine(4000);
    await engine.run('assess', await task(1));

    await expect(engine.run('assess', await task(100_000))).rejects.toMatchObject({
      status: 400,
      type: 'too-costly',
    });
    expect((await engine.run('assess', await task(1))).read().bands).toHaveLength(1);
  });
});
