import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { trapAnswer } from '../../shared/contracts/trap.ts';
import type { ApiClient } from '../support/api-client.ts';
import { type ApiServer, startApiServer } from '../support/api-server.ts';

let server: ApiServer;
let visitor: ApiClient;
beforeAll(async () => {
  server = await startApiServer();
  visitor = await server.visitor();
});
afterAll(() => server.close());

const asked = (change: object = {}) => ({
  frequencyHz: 455_000,
  kind: 'parallel',
  inductanceH: 500e-6,
  q: 100,
  sourceOhms: 400,
  loadOhms: 1000,
  atHz: [455_000, 465_000, 540_000],
  ...change,
});
const designed = async (change: object = {}) => {
  const { body } = await visitor.post('/api/traps', asked(change)).expect(200);
  return trapAnswer.parse(body);
};

describe('POST /api/traps', () => {
  // The losses are those of the same circuits solved by ngspice.
  it.each([
    ['parallel', [40.26532, 27.28275, 9.98388]],
    ['series', [26.43945, 13.63168, 1.36914]],
  ])('answers a visitor the loss of a %s trap', async (kind, losses) => {
    const { loss, parts, capacitanceF } = await designed({ kind });

    loss.forEach(({ db }, index) => {
      expect(db).toBeCloseTo(losses[index] ?? NaN, 3);
    });
    expect(parts.capacitanceF * 1e12).toBeCloseTo(244.7076, 4);
    expect({ inductanceH: 500e-6, capacitanceF }).toEqual(parts);
  });

  it('answers preferred values with the frequency that each gives', async () => {
    const { preferred } = await designed();

    const hz = (farads: number) => Math.round(1 / (2 * Math.PI * Math.sqrt(500e-6 * farads)));
    // IEC 60063: of E12 220 pF lies nearest to 244.7, of E24 240.
    expect(preferred).toEqual({
      E12: { inductanceH: 500e-6, capacitanceF: 220e-12, frequencyHz: hz(220e-12) },
      E24: { inductanceH: 500e-6, capacitanceF: 240e-12, frequencyHz: hz(240e-12) },
    });
  });

  it('finds the coil for a capacitor that is at hand', async () => {
    const change = { inductanceH: undefined, capacitanceF: 244.7076e-12, atHz: [] };
    const { parts, preferred, loss } = await designed(change);

    expect(parts.inductanceH * 1e6).toBeCloseTo(500, 3);
    expect(preferred.E12).toMatchObject({ inductanceH: 470e-6, capacitanceF: 244.7076e-12 });
    expect(loss).toEqual([]);
  });

  it.each<[string, object, RegExp]>([
    ['capacitanceF', { capacitanceF: 1e-10 }, /not both/],
    ['inductanceH', { inductanceH: undefined }, /the coil or the capacitor/],
    ['inductanceH', { inductanceH: 0.9, frequencyHz: 900_000_000 }, /would have to be .* F/],
    [
      'capacitanceF',
      { inductanceH: undefined, capacitanceF: 1e-12, frequencyHz: 1000 },
      /would have to be .* H/,
    ],
    ['inductanceH', { inductanceH: 0 }, /1 nH or more/],
    ['inductanceH', { inductanceH: '500 uH' }, /henries/],
    ['inductanceH', { inductanceH: null }, /henries/],
    ['q', { q: 0 }, /Q of 1 or more/],
    ['frequencyHz', { frequencyHz: 0 }, /1 kHz or more/],
    ['frequencyHz', { frequencyHz: null }, /whole number of hertz/],
    ['kind', { kind: 'notch' }, /parallel/],
    ['sourceOhms', { sourceOhms: 0 }, /0.1 ohm/],
    ['loadOhms', { loadOhms: -5 }, /0.1 ohm/],
    ['atHz.1', { atHz: [455_000, 0] }, /1 kHz or more/],
    ['atHz', { atHz: Array(1001).fill(455_000) }, /1000 frequencies or fewer/],
    ['colour', { colour: 'red' }, /./],
  ])('with a bad %s says what would be right', async (path, change, message) => {
    const { body } = await visitor.post('/api/traps', asked(change)).expect(400);

    expect(body.issues).toMatchObject([{ path, message: expect.stringMatching(message) }]);
  });
});
