import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import reference from '../../datasets/reference/tracking.json' with { type: 'json' };
import { trackingAnswer, type TrackingInput } from '../../shared/contracts/tracking.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { sentReceiver } from '../support/receivers.ts';
import { BARE_SITE } from '../support/sites.ts';

let server: ApiServer;
let visitor: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  visitor = await server.visitor();
});
afterAll(() => server.close());

const asked = (change: Partial<Record<keyof TrackingInput, unknown>> = {}) => ({
  lowHz: 550_000,
  highHz: 1_600_000,
  ifHz: 455_000,
  oscillator: 'above',
  gangMinF: 40e-12,
  gangMaxF: 400e-12,
  trimmer: 'gang',
  points: [600_000, 1_000_000, 1_400_000],
  ...change,
});

const design = async (change: Partial<Record<keyof TrackingInput, unknown>> = {}) => {
  const { body } = await visitor.post('/api/tracking', asked(change)).expect(200);
  return trackingAnswer.parse(body);
};

describe('POST /api/tracking', () => {
  const [acrossGang] = reference.parts.checks;

  it(`answers a visitor with the parts: ${reference.parts.source}`, async () => {
    const answer = await design();

    expect(answer.refused).toBeNull();
    expect((answer.padderF ?? NaN) * 1e12).toBeCloseTo(acrossGang?.padderPf ?? NaN, 4);
    expect((answer.oscillatorCoilH ?? NaN) * 1e6).toBeCloseTo(acrossGang?.coilUh ?? NaN, 4);
    expect((answer.oscillatorTrimmerF ?? NaN) * 1e12).toBeCloseTo(acrossGang?.trimmerPf ?? NaN, 4);
    expect((answer.signalCoilH ?? NaN) * 1e6).toBeCloseTo(reference.parts.signalCoilUh, 4);
  });

  it('gives the error at 41 settings from end to end and at the points', async () => {
    const { errors, worstErrorHz } = await design();

    const settings = Array.from({ length: 41 }, (_, index) => 550_000 + index * 26_250);
    const dials = new Set([...settings, 600_000, 1_000_000, 1_400_000]);
    expect(errors.map(({ dialHz }) => dialHz)).toEqual([...dials].sort((a, b) => a - b));
    for (const hz of [600_000, 1_000_000, 1_400_000]) {
      expect(errors.find(({ dialHz }) => dialHz === hz)?.errorHz).toBeCloseTo(0, 3);
    }
    expect(errors.at(-1)?.errorHz).toBeCloseTo(-11_657.42, 1);
    expect(worstErrorHz).toBeCloseTo(11_657.42, 1);
  });

  it('finds the best points itself', async () => {
    const { pointsHz, worstErrorHz } = await design({ points: 'best' });

    expect(pointsHz).toEqual([606_386, 1_016_923, 1_514_599]);
    expect(worstErrorHz).toBeCloseTo(4474, 0);
  });

  it('keeps a padder and refits coil and trimmer after a change of IF', async () => {
    const before = await design();
    const kept = { fixedPadderF: 436.837e-12, alignHz: [600_000, 1_400_000] };

    const after = await design({ ...kept, ifHz: 450_000 });

    expect(after.padderF).toBe(436.837e-12);
    expect((after.oscillatorCoilH ?? NaN) / (before.oscillatorCoilH ?? NaN)).toBeCloseTo(
      1.01019,
      5,
    );
    expect((after.oscillatorTrimmerF ?? NaN) * 1e12).toBeCloseTo(18.7788, 3);
  });

  it.each([
    ['a gang too small for the band', { gangMaxF: 200e-12 }],
    ['a trimmer that would be less than the stray', { strayF: 30e-12 }],
  ])('refuses %s, says why and gives no parts', async (_what, change) => {
    const answer = await design(change);

    expect(answer.refused?.reason).toMatch(/capacitance/);
    expect(answer).toMatchObject({ padderF: null, oscillatorCoilH: null, errors: [] });
  });

  it.each<[string, Partial<Record<keyof TrackingInput | 'colour', unknown>>]>([
    ['highHz', { highHz: 550_000 }],
    ['oscillator', { oscillator: 'below', ifHz: 600_000 }],
    ['oscillator', { oscillator: 'beside' }],
    ['gangMinF', { gangMinF: 0 }],
    ['gangMaxF', { gangMaxF: 40e-12 }],
    ['strayF', { strayF: -1e-12 }],
    ['trimmer', { trimmer: undefined }],
    ['points', { points: [600_000, 1_400_000, 1_000_000] }],
    ['points', { points: [400_000, 1_000_000, 1_400_000] }],
    ['points', { points: [600_000, 1_400_000] }],
    ['fixedPadderF', { fixedPadderF: 0 }],
    ['alignHz', { fixedPadderF: 400e-12, alignHz: [600_000, 600_000] }],
    ['colour', { colour: 'red' }],
  ])('with a bad %s, answers 400 and names it', async (path, change) => {
    const { body } = await visitor.post('/api/tracking', asked(change)).expect(400);

    expect(body.issues.map((each: { path: string }) => each.path)).toContain(path);
  });

  it('holds the tracking data of a receiver to the same', async () => {
    const { lowHz, highHz, ifHz: _ifHz, oscillator, ...tracking } = asked({ gangMaxF: 1e-12 });
    const bands = [{ name: 'MW', lowHz, highHz, oscillator, tracking }];
    const receiver = { ...sentReceiver(), bands };
    const request = { receiver, site: BARE_SITE, everyChannelDb: 70 };

    const { body } = await visitor.post('/api/assessments', request).expect(400);

    expect(body.issues).toContainEqual(
      expect.objectContaining({ path: 'receiver.bands.0.tracking.gangMaxF' }),
    );
  });
});

describe('the limit of computing', () => {
  it('counts designs of a visitor', async () => {
    const limited = await startApiServer({ LIMIT_COMPUTE_VISITOR: '1' });
    try {
      const somebody = await limited.visitor();
      await somebody.post('/api/tracking', asked()).expect(200);

      await somebody.post('/api/tracking', asked()).expect(429);
    } finally {
      await limited.close();
    }
  });
});
