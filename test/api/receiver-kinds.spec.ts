/** Every part a receiver can have, over HTTP, each with a figure from outside the engine. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { type Assessment, assessment } from '../../shared/contracts/assessment.ts';
import { candidatesAnswer } from '../../shared/contracts/candidates.ts';
import { receiverDraft, type ReceiverInput } from '../../shared/contracts/receiver.ts';
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';
import { plainResponses } from '../support/plain-assessment.ts';
import { siteIn } from '../support/plain-sets.ts';
import { sentReceiver } from '../support/receivers.ts';
import { BARE_SITE } from '../support/sites.ts';

let server: ApiServer;
let visitor: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  visitor = await server.visitor();
});
afterAll(() => server.close());

type BandInput = ReceiverInput['bands'][number];
type Heard = Assessment['bands'][number]['responses'][number];

const mediumWave = (change: Partial<BandInput> = {}): BandInput[] => [
  { name: 'MW', lowHz: 550_000, highHz: 1_600_000, oscillator: 'above', ...change },
];
const given = (...list: (readonly [hz: number, db: number])[]) =>
  list.map(([frequencyHz, fieldDb]) => ({ frequencyHz, fieldDb }));

async function assessed(receiver: Partial<ReceiverInput>, stations: object[], change = {}) {
  const request = {
    receiver: sentReceiver({ strayDb: null, bands: mediumWave(), ...receiver }),
    site: BARE_SITE,
    stations,
    leaveOutBetterThan: null,
    limit: 10_000,
    ...change,
  };
  const { body } = await visitor.post('/api/assessments', request).expect(200);
  return assessment.parse(body);
}

function find({ bands: [band] }: Assessment, sought: Partial<Heard>): Heard {
  const found = band?.responses.find((each) =>
    Object.entries(sought).every(([key, value]) => each[key as keyof Heard] === value),
  );
  if (found === undefined) throw new Error(`There is no ${JSON.stringify(sought)}.`);
  return found;
}
const term = ({ ledger }: Heard, name: string): number =>
  ledger.find((line) => line.term === name)?.valueDb ?? NaN;
const db = (power: number): number => 10 * Math.log10(power);
/** Loss of one isolated circuit. */
const circuit = (hz: number, tunedHz: number, q = 80): number =>
  db(1 + (q * (hz / tunedHz - tunedHz / hz)) ** 2);

describe('IF transformers', () => {
  const selectivity = { kind: 'transformers', count: 2, q: 60, coupling: 1 } as const;

  it('reject by the formula of critical pairs, and give the noise its width', async () => {
    // 40 kHz is twice the second IF of 20 kHz: x = 2 Q df/f0, 10 log10(1 + x^4/4) a pair.
    const secondConversion = { ifHz: 20_000, oscillator: 'above' } as const;
    const found = await assessed({ selectivity, secondConversion }, given([960_000, 100]));

    const second = find(found, { cause: 'second-image', station: 0 });
    const x = (2 * 60 * 40_000) / 455_000;
    expect(term(second, 'second-conversion')).toBeCloseTo(-2 * db(1 + x ** 4 / 4), 6);
    // -6 dB of two pairs is -3 dB of each: x^4 = 4 (10^0.3 - 1).
    const b6Hz = ((4 * (10 ** 0.3 - 1)) ** 0.25 * 455_000) / 60;
    const mhz = Math.log10((second.dialHz ?? NaN) / 1e6);
    const noise = 72.5 - 27.7 * mhz + 20 * mhz + db(b6Hz) - 95.5;
    expect(second.noiseDb).toBeCloseTo(noise, 6);
  });

  it('wider than any IF amplifier are refused', async () => {
    const receiver = sentReceiver({ selectivity: { ...selectivity, q: 2 } });
    const request = { receiver, site: BARE_SITE, everyChannelDb: 60 };

    const { body } = await visitor.post('/api/assessments', request).expect(400);

    expect(body.issues).toMatchObject([{ path: 'receiver.selectivity.q' }]);
  });
});

describe('a measured table of selectivity', () => {
  const points = [
    [0, 0],
    [3000, 6],
    [6000, 25],
    [11_000, 62],
    [20_000, 70],
  ].map(([offsetHz = 0, rejectionDb = 0]) => ({ offsetHz, rejectionDb }));
  const selectivity = { kind: 'table', points } as const;

  it.each([
    ['at a point', 10_000, 70],
    ['beyond the last', 30_000, 70],
  ])('rejects %s as measured', async (_where, ifHz, rejectionDb) => {
    const secondConversion = { ifHz, oscillator: 'above' } as const;
    const found = await assessed({ selectivity, secondConversion }, given([960_000, 110]));

    const second = find(found, { cause: 'second-image' });
    expect(term(second, 'second-conversion')).toBeCloseTo(-rejectionDb, 6);
  });

  it.each<[string, object[]]>([
    ['receiver.selectivity.points', points.toReversed()],
    ['receiver.selectivity.points', [...points, { offsetHz: 600_000, rejectionDb: 80 }]],
    ['receiver.selectivity.points.0.rejectionDb', [{ offsetHz: 0, rejectionDb: null }, ...points]],
  ])('with bad %s is refused', async (path, bad) => {
    const receiver = { ...sentReceiver(), selectivity: { kind: 'table', points: bad } };
    const request = { receiver, site: BARE_SITE, everyChannelDb: 60 };

    const { body } = await visitor.post('/api/assessments', request).expect(400);

    expect(body.issues[0].path).toBe(path);
  });
});

describe('the aerial', () => {
  const image = { cause: 'image', dialHz: 612_000 } as const;

  it('as a loop takes 20 dB a decade from what lies above the dial', async () => {
    const found = await assessed({ aerial: { kind: 'loop' } }, given([1_521_000, 90]));

    const loop = 20 * Math.log10(1_521_000 / 612_000);
    expect(term(find(found, image), 'aerial')).toBeCloseTo(loop, 9);
  });

  it('with a primary resonant below the band adds its term', async () => {
    const aerial = { kind: 'primary', resonanceHz: 380_000, q: 30 } as const;
    const found = await assessed({ aerial }, given([1_521_000, 90]));

    const rho = (hz: number) => 1 / 30 ** 2 + (hz / 380_000 - 380_000 / hz) ** 2;
    expect(term(find(found, image), 'aerial')).toBeCloseTo(-db(rho(1_521_000) / rho(612_000)), 9);
  });

  it('with a primary resonant on the band is left out, and said so', async () => {
    const aerial = { kind: 'primary', resonanceHz: 700_000, q: 30 } as const;
    const found = await assessed({ aerial }, given([1_521_000, 90]));

    expect(term(find(found, image), 'aerial')).toBeNaN();
    expect(found.warnings).toContainEqual(expect.objectContaining({ path: 'aerial' }));
  });
});

describe('a second conversion', () => {
  const secondConversion = { ifHz: 85_000, oscillator: 'above' } as const;
  const receiver = {
    ifHz: 1_600_000,
    secondConversion,
    bands: mediumWave({ lowHz: 1_650_000, highHz: 4_000_000 }),
  };

  it('lets the second image through, two second IFs from the dial', async () => {
    const found = await assessed(receiver, given([3_170_000, 110], [3_000_000, 80]));

    const second = find(found, { cause: 'second-image', station: 0, dialHz: 3_340_000 });
    expect(second).toMatchObject({ beatHz: 0, name: 'second image' });
    expect(term(second, 'circuit-1')).toBeCloseTo(-circuit(3_170_000, 3_340_000), 9);
    // 170 kHz from the first IF the model of the two widths stands at its cap.
    expect(term(second, 'second-conversion')).toBe(-90);
  });

  it('lets a station on the second IF through, and shows its oscillator on the band', async () => {
    const found = await assessed(receiver, given([85_000, 110], [3_000_000, 80]));

    expect(find(found, { name: 'breakthrough of the second IF' })).toMatchObject({ station: 0 });
    expect(found.bands[0]?.secondOscillator).toEqual([
      { harmonic: 1, dialHz: 1_685_000 },
      { harmonic: 2, dialHz: 3_370_000 },
    ]);
    expect((await assessed({}, [])).bands[0]?.secondOscillator).toEqual([]);
  });
});

describe('tracking data', () => {
  const tracking: BandInput['tracking'] = {
    gangMinF: 40e-12,
    gangMaxF: 400e-12,
    trimmer: 'gang',
    points: [600_000, 1_000_000, 1_400_000],
  };

  it('leave the signal circuits where the three-point curve has them', async () => {
    // With circuits on 1500 kHz the oscillator makes the set hear 4.60746 kHz lower (published
    // coefficients, checked against ngspice in test/reference/tracking.spec.ts).
    const dialHz = 1_500_000 - 4607;
    const stations = given([dialHz, 90], [dialHz + 910_000, 100]);
    const found = await assessed({ bands: mediumWave({ tracking }) }, stations);

    const image = find(found, { cause: 'image', station: 1, dialHz });
    const a = circuit(dialHz + 910_000, 1_500_000) - circuit(dialHz, 1_500_000);
    expect(image.beatHz).toBe(0);
    expect(Math.abs(term(image, 'circuit-1') + a)).toBeLessThan(0.001);
  });

  it('are left out where no parts can be found, and said so', async () => {
    const impossible: BandInput['tracking'] = { ...tracking, gangMaxF: 50e-12 };
    const found = await assessed({ bands: mediumWave({ tracking: impossible }) }, []);

    expect(found.warnings).toContainEqual(expect.objectContaining({ path: 'bands.0.tracking' }));
  });

  it('give candidates what refitting the oscillator costs', async () => {
    const request = {
      receiver: sentReceiver({ bands: mediumWave({ tracking }) }),
      site: BARE_SITE,
      everyChannelDb: 60,
      fromHz: 450_000,
      toHz: 470_000,
      stepHz: 20_000,
    };

    const { body } = await visitor.post('/api/if-candidates', request).expect(200);

    const { candidates } = candidatesAnswer.parse(body);
    expect(candidates.every(({ trackingCostDb }) => (trackingCostDb ?? 0) > 0)).toBe(true);
  });
});

describe('orders up to the fifth of the oscillator and the third of the signal', () => {
  it.each([
    ['on the fundamental', mediumWave()],
    ['on the 2nd harmonic', mediumWave({ lowHz: 6e6, highHz: 7e6, oscillatorHarmonic: 2 })],
  ])('%s answer what multiplying out every product answers', async (_on, bands) => {
    const stations = given(
      [227_500, 100],
      [455_000, 90],
      [700_000, 60],
      [909_000, 105],
      [1_365_000, 95],
      [1_500_000, 100],
      [2_300_000, 100],
      [3_000_000, 100],
      [4_700_000, 100],
      [6_500_000, 90],
      [6_910_000, 100],
      [9_700_000, 105],
      [13_500_000, 105],
      [17_000_000, 105],
    );
    const order = { maxM: 5, maxN: 3 };

    const found = await assessed({ bands }, stations, order);

    const listed = stations.map((each, id) => ({
      ...each,
      id,
      groundDb: each.fieldDb,
      given: true,
    }));
    const expected = plainResponses({
      receiver: receiverDraft.parse(sentReceiver({ strayDb: null, bands })),
      site: siteIn(1),
      stations: listed,
      raster: defaultRaster(1),
      period: 'night',
      ...order,
    });
    const ratios = (list: { m: number | null; ratioDb: number | null }[]) =>
      list.map(({ m, ratioDb }) => [m, (ratioDb ?? NaN).toFixed(6)].join()).sort();
    const answered = found.bands[0]?.responses.filter(({ cause }) => cause !== 'intermodulation');
    expect(ratios(answered ?? [])).toEqual(ratios(expected));
    expect(new Set(expected.map(({ m, n }) => `${m}/${n}`)).size).toBeGreaterThan(10);
  });
});
