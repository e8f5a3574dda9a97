import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import {
  givenStations,
  plainBand,
  plainReceiver,
  siteIn,
} from '../../../test/support/plain-sets.ts';
import { plainCase, receivers, sites, stationLists } from '../../../test/support/random-cases.ts';
import { assess } from '../assessment/assessment.ts';
import { stationsOnEveryChannel } from '../channels/assumed-stations.ts';
import { defaultRaster, nearestChannel } from '../channels/raster.ts';
import type { Band, Receiver } from '../receiver.ts';
import { whistleCauses, type WhistleInput, type Whistles } from './whistle-causes.ts';
import type { WhistleCause, WhistleSource } from './whistle-cause.ts';

type List = readonly (readonly [hz: number, db: number])[];

const ask = (list: List, dialHz: number, over: Partial<WhistleInput> = {}): WhistleInput => ({
  receiver: plainReceiver(),
  site: siteIn(1),
  ...givenStations(list),
  raster: defaultRaster(1),
  dialHz,
  pitchHz: null,
  pitchSlope: null,
  ...over,
});

const withBand = (band: Partial<Band>, set: Partial<Receiver> = {}) => ({
  receiver: plainReceiver({ ...set, bands: [plainBand(band)] }),
});

function found(
  { causes }: Whistles,
  cause: WhistleSource,
): Pick<WhistleCause, 'pitchHz' | 'slope'> {
  const one = causes.find((each) => each.cause === cause);
  if (!one) throw new Error(`no ${cause} among ${causes.map((each) => each.cause).join()}`);
  return { pitchHz: one.pitchHz, slope: one.slope };
}

describe('examples worked by hand, IF 455 kHz', () => {
  it('image: oscillator 1067, 1521 - 1067 = 454 falls, 455 rises with the dial', () => {
    const whistles = whistleCauses(ask([[1_521_000, 90]], 612_000));

    expect(whistles.wanted).toMatchObject({ station: null, frequencyHz: 612_000 });
    expect(found(whistles, 'image')).toEqual({ pitchHz: 1000, slope: 2 });
  });

  it('image with the dial 300 Hz above the station: 1521 - 1067.3 = 453.7 beats with 455.3', () => {
    const list: List = [
      [612_000, 70],
      [1_521_000, 90],
    ];
    const whistles = whistleCauses(ask(list, 612_300));

    expect(whistles.wanted).toMatchObject({ station: 0, frequencyHz: 612_000, fieldDb: 70 });
    expect(found(whistles, 'image')).toEqual({ pitchHz: 1600, slope: 2 });
  });

  it('image with the oscillator below: 1145 - 691 = 454 rises, 455 falls', () => {
    const band = withBand({ oscillator: 'below', lowHz: 1_500_000, highHz: 1_700_000 });
    const whistles = whistleCauses(ask([[691_000, 100]], 1_600_000, { ...band, raster: [] }));

    expect(found(whistles, 'image')).toEqual({ pitchHz: 1000, slope: 2 });
  });

  it('breakthrough: 456 stands still, 455 rises', () => {
    const whistles = whistleCauses(ask([[456_000, 90]], 603_000));

    expect(found(whistles, 'breakthrough')).toEqual({ pitchHz: 1000, slope: 1 });
  });

  it('oscillator harmonic: 2910 - 2456 = 454 rises by 2, 2910 + 456 = 3366 falls by 2', () => {
    const less = whistleCauses(ask([[2_456_000, 110]], 1_000_000, { raster: [] }));
    const plus = whistleCauses(ask([[3_366_000, 115]], 1_000_000, { raster: [] }));

    expect(found(less, 'oscillator-harmonic')).toEqual({ pitchHz: 1000, slope: 1 });
    expect(found(plus, 'oscillator-harmonic')).toEqual({ pitchHz: 1000, slope: 3 });
  });

  it('half-IF: twice 1228 less twice 1455 is -454, falls by 2 while 455 rises', () => {
    const whistles = whistleCauses(ask([[1_228_000, 110]], 1_000_000, { raster: [] }));

    // 2910 - 2456 = 454 rises by 2.
    expect(found(whistles, 'half-if')).toEqual({ pitchHz: 1000, slope: 1 });
  });

  it('band on the oscillator’s 2nd harmonic: its fundamental moves half as fast', () => {
    const band = withBand({ oscillatorHarmonic: 2 });
    // Oscillator 727.5; 727.5 + 456 = 1183.5 falls by 1/2 while 455 rises by 1.
    const whistles = whistleCauses(ask([[1_183_500, 110]], 1_000_000, { ...band, raster: [] }));

    expect(found(whistles, 'oscillator-harmonic')).toEqual({ pitchHz: 1000, slope: 1.5 });
  });

  it('the station next door: 621 less 612, both move alike', () => {
    const list: List = [
      [612_000, 70],
      [621_000, 80],
    ];

    expect(found(whistleCauses(ask(list, 612_000)), 'adjacent-carrier')).toEqual({
      pitchHz: 9000,
      slope: 0,
    });
  });

  it('IF harmonic: 909 against twice 455, and 1.4 kHz when tuned 200 Hz high', () => {
    const list: List = [[909_000, 70]];

    expect(found(whistleCauses(ask(list, 909_000)), 'if-harmonic')).toEqual({
      pitchHz: 1000,
      slope: 2,
    });
    // 2 x 455.2 = 910.4.
    expect(found(whistleCauses(ask(list, 909_200)), 'if-harmonic')).toEqual({
      pitchHz: 1400,
      slope: 2,
    });
  });

  it('beat oscillator: twice 455.5 = 911 beats with the station on 909 wherever it is tuned', () => {
    const receiver = plainReceiver({ bfo: { centreHz: 455_500, rangeHz: 3000, pitchHz: 1000 } });

    expect(
      found(whistleCauses(ask([[909_000, 70]], 909_000, { receiver })), 'bfo-harmonic'),
    ).toEqual({ pitchHz: 2000, slope: 0 });
  });

  it('beacon heard with the beat oscillator on 456: an image at 454 beats by itself', () => {
    const set = withBand(
      { service: 'beacon' },
      { bfo: { centreHz: 455_000, rangeHz: 3000, pitchHz: 1000 } },
    );

    expect(found(whistleCauses(ask([[1_521_000, 90]], 612_000, set)), 'image')).toEqual({
      pitchHz: 2000,
      slope: 1,
    });
  });

  it('second conversion 1600 to 85, both above: image 2000 - 170 = 1830, oscillator 1685', () => {
    const set = withBand(
      { lowHz: 1_650_000, highHz: 4_000_000 },
      { ifHz: 1_600_000, secondConversion: { ifHz: 85_000, oscillator: 'above' } },
    );
    const image = whistleCauses(ask([[1_831_000, 120]], 2_000_000, { ...set, raster: [] }));
    const own = whistleCauses(ask([[1_684_000, 70]], 1_684_000, { ...set, raster: [] }));

    expect(found(image, 'second-image')).toEqual({ pitchHz: 1000, slope: 2 });
    expect(found(own, 'second-oscillator')).toEqual({ pitchHz: 1000, slope: 0 });
  });

  it('two stations 456 apart: the difference stands still', () => {
    const list: List = [
      [1_000_000, 90],
      [1_456_000, 90],
    ];

    expect(found(whistleCauses(ask(list, 603_000)), 'intermodulation')).toEqual({
      pitchHz: 1000,
      slope: 1,
    });
  });
});

describe('the order of the causes', () => {
  const list: List = [
    [612_000, 70],
    [621_000, 90],
    [456_000, 80],
    [1_521_000, 75],
  ];
  const first = (heard: Partial<WhistleInput>): string =>
    whistleCauses(ask(list, 612_000, heard)).causes[0]?.cause ?? '';

  it('is by level where nothing was noted', () => {
    const levels = whistleCauses(ask(list, 612_000)).causes.map(({ levelDb }) => levelDb ?? -999);

    expect(levels).toEqual(levels.toSorted((a, b) => b - a));
  });

  it('follows pitch and slope, whichever sign the slope has', () => {
    expect(first({ pitchHz: 1000, pitchSlope: 2 })).toBe('image');
    expect(first({ pitchHz: 1000, pitchSlope: -2 })).toBe('image');
    expect(first({ pitchHz: 1000, pitchSlope: 1 })).toBe('breakthrough');
    expect(first({ pitchHz: 9000, pitchSlope: 0 })).toBe('adjacent-carrier');
    expect(first({ pitchHz: 9000 })).toBe('adjacent-carrier');
  });

  it('shows the usual caution with every test that touches the set, and only there', () => {
    const { causes } = whistleCauses(ask(list, 612_000));

    expect(causes.find(({ cause }) => cause === 'image')?.test).toContain('Caution');
    expect(causes.find(({ cause }) => cause === 'adjacent-carrier')?.test).not.toContain('Caution');
  });
});

describe('laws', () => {
  const drawn = fc
    .record({
      receiver: receivers,
      site: sites,
      stations: stationLists,
      period: fc.constant('night' as const),
      maxM: fc.constant(5),
      maxN: fc.constant(3),
      place: fc.double({ min: 0.1, max: 0.9, noNaN: true }),
      besideHz: fc.integer({ min: -900, max: 900 }),
    })
    .map(({ place, besideHz, ...each }) => {
      const [band] = each.receiver.bands;
      const { lowHz = 0, highHz = 0 } = band ?? {};
      const { input, receiver, site, raster } = plainCase(each);
      const somewhere = Math.round(lowHz + place * (highHz - lowHz));
      const channel = nearestChannel(raster, somewhere) ?? NaN;
      const dialHz = (Math.abs(channel - somewhere) < 10_000 ? channel : somewhere) + besideHz;
      return { receiver, site, ...input, raster, dialHz, pitchHz: null, pitchSlope: null };
    });
  const key = ({ cause, name, station, secondStation, frequencyHz }: WhistleCause): string =>
    [cause, name, station, secondStation, cause === 'if-harmonic' ? '' : frequencyHz].join();

  it('the pitch moves as fast as the slope says when the dial moves by 40 Hz', () => {
    let compared = 0;
    fc.assert(
      fc.property(drawn, (few) => {
        const input = { ...few, stations: stationsOnEveryChannel(few.raster, 90), fields: [] };
        const here = whistleCauses(input);
        const there = whistleCauses({ ...input, dialHz: input.dialHz + 40 });
        if (here.wanted.frequencyHz !== there.wanted.frequencyHz) return;
        const moved = new Map(there.causes.map((cause) => [key(cause), cause]));

        for (const cause of here.causes) {
          const after = moved.get(key(cause));
          if (!after || cause.pitchHz < 400) continue;
          const change = Math.abs(after.pitchHz - cause.pitchHz);
          expect(Math.abs(change - 40 * cause.slope)).toBeLessThanOrEqual(1);
          compared++;
        }
      }),
      { numRuns: 40, seed: 612 },
    );
    expect(compared).toBeGreaterThan(100);
  });

  it('the order of the list does not matter', () => {
    fc.assert(
      fc.property(drawn, (input) => {
        const turned = { ...input, stations: input.stations.toReversed() };

        expect(whistleCauses(turned).causes).toEqual(whistleCauses(input).causes);
      }),
      { numRuns: 50 },
    );
  });

  it('every level is a number, every pitch within hearing', () => {
    fc.assert(
      fc.property(drawn, (input) => {
        for (const { levelDb, pitchHz, slope } of whistleCauses(input).causes) {
          expect(levelDb ?? 0).toSatisfy(Number.isFinite);
          expect(pitchHz).toBeLessThanOrEqual(16_000);
          expect(slope).toBeGreaterThanOrEqual(0);
        }
      }),
      { numRuns: 50 },
    );
  });

  it('what the assessment finds at a channel is among the causes, with the same beat', () => {
    const given = ask(
      [
        [1_521_000, 90],
        [456_000, 95],
        [1_071_500, 95],
      ],
      612_000,
    );
    const { receiver, site, stations, fields, raster } = given;
    const orders = {
      period: 'night',
      maxM: 5,
      maxN: 3,
      limit: 9999,
      leaveOutBetterThan: null,
    } as const;
    const all = assess({ receiver, site, stations, fields, raster, ...orders });
    const here = all.bands[0]?.responses.filter(
      ({ dialHz, hidden }) => dialHz === 612_000 && hidden === null,
    );
    const { causes } = whistleCauses(given);

    expect(here?.length).toBeGreaterThan(0);
    for (const { station, cause, beatHz } of here ?? []) {
      const match = causes.find((each) => each.station === station && each.cause === cause);
      expect(match?.pitchHz).toBe(beatHz);
    }
  });
});

it('refuses a dial setting that no band tunes', () => {
  expect(() => whistleCauses(ask([], 300_000))).toThrow('dialHz');
});
