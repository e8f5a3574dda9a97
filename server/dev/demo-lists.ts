/**
 * The two regions of the demo club: what their lists in `datasets/demo` are made from.
 */
import { defaultRaster } from '../../shared/radio/channels/raster.ts';
import { type ListPlan, type ListRow, listRows } from './list-generator.ts';

/** A list that is partly planned by hand. */
interface DemoList {
  readonly file: string;
  readonly plan: ListPlan;
  /** Stations beside the generated ones: the neighbours of the demo sites, and other services. */
  readonly byHand: readonly ListRow[];
}

/** Long-wave stations are few, so that they are planned by hand. */
const MEDIUM_WAVE_9 = defaultRaster(1).filter(({ lowHz }) => lowHz > 300_000);

/** Both regions lie in open sea, where no real station can be meant. */
export const DEMO_LISTS: readonly DemoList[] = [
  {
    file: 'torvane-isles.csv',
    plan: {
      seed: 1,
      rows: 200,
      raster: MEDIUM_WAVE_9,
      // Kept clear, so that an IF of 560 kHz has no neighbour at 2 kHz here.
      unusedHz: [558_000],
      callPrefix: 'QI',
      area: { south: 41, north: 48, west: -25, east: -13 },
    },
    byHand: [
      byHand('Radio Maelquay', 'QIS1', 1053, 44.62, -19.31, 50, 50, 'the nearest strong station'),
      byHand('Maelquay Sound', 'QIS2', 909, 44.58, -19.2, 5, 1, 'reduced at night'),
      byHand('Torvane Long Wave', 'QIL1', 198, 44.1, -18.2, 250, 250, 'national service'),
      byHand('Ithness Long Wave', 'QIL2', 162, 46.8, -22.7, 300, 300, 'national service'),
      byHand('Gorrvoe Long Wave', 'QIL3', 234, 42.3, -15.1, 500, 250, 'reduced at night'),
      byHand('Faelmoor Long Wave', 'QIL4', 252, 47.3, -14.8, 150, 150, 'national service'),
      byHand('Dunilshaw Long Wave', 'QIL5', 279, 41.6, -23.9, 100, 0, 'daytime only'),
      byHand('Ithness Point beacon', 'QICP', 316.5, 44.4, -19.9, 0.1, 0.1, 'marine beacon'),
      byHand('Gorrvoe Light beacon', 'QIHL', 287.3, 45.2, -18.7, 0.1, 0.1, 'marine beacon'),
      byHand('Maelquay aerodrome', 'QISA', 381, 44.61, -19.4, 0.05, 0.05, 'aeronautical beacon'),
      byHand('Faelmoor aerodrome', 'QIBA', 455, 44.9, -18.9, 0.05, 0.05, 'aeronautical beacon'),
      byHand('Torvane coast radio', 'QICR', 466, 43.6, -20.1, 1, 1, 'coast station, telegraphy'),
      byHand('Torvane coast radio', 'QICR', 484, 43.6, -20.1, 1, 1, 'coast station, telegraphy'),
      byHand('Torvane coast radio', 'QICR', 1837, 43.6, -20.1, 1, 1, 'coast station, calling'),
      byHand('Torvane amateur beacon', 'QIAB', 475.7, 44.7, -19, 0.001, 0.001, 'amateur beacon'),
      byHand('Torvane World Service', 'QIW1', 6005, 42.2, -22.4, 100, 100, 'abroad, evenings'),
      byHand('Torvane World Service', 'QIW2', 9560, 42.2, -22.4, 100, 100, 'abroad, mornings'),
      byHand('Torvane World Service', 'QIW3', 11790, 42.2, -22.4, 100, 0, 'abroad, by day'),
      byHand('Torvane World Service', 'QIW4', 15320, 42.2, -22.4, 100, 0, 'abroad, by day'),
    ],
  },
  {
    file: 'quorrel-coast.csv',
    plan: {
      seed: 2,
      rows: 210,
      raster: defaultRaster(2),
      // 560 and 600 are given by hand; the low end of the dial is quiet, so that breakthrough shows.
      unusedHz: [560_000, 600_000, 610_000, 620_000, 630_000],
      callPrefix: 'QS',
      area: { south: 29, north: 37, west: -62, east: -48 },
    },
    byHand: [
      byHand('Radio Zelmere', 'QSAQ', 560, 33.4, -55.37, 10, 10, 'two masts, day and night'),
      byHand('Vessgard Sound', 'QSFS', 560, 36.4, -49.2, 5, 1, 'reduced at night'),
      byHand('Jornfell Sound', 'QSJS', 600, 33.9, -54.6, 5, 5, 'one mast'),
      byHand('Zelmere Second', 'QSA2', 850, 33.1, -55.6, 10, 5, 'reduced at night'),
      byHand('Voice of Quorrel', 'QSVS', 1240, 33.7, -55, 50, 50, 'one mast'),
      byHand('Zelmere aerodrome', 'QSAA', 382, 33.3, -55.2, 0.1, 0.1, 'aeronautical beacon'),
      byHand('Jornfell aerodrome', 'QSRA', 521, 34.1, -54.4, 0.1, 0.1, 'aeronautical beacon'),
      byHand('Haskrock Light beacon', 'QSSL', 298.5, 32.6, -56.1, 0.1, 0.1, 'marine beacon'),
      byHand('Quorrel coast radio', 'QSCR', 462, 32.2, -54.8, 1, 1, 'coast station, telegraphy'),
      byHand('Quorrel coast radio', 'QSCR', 472, 32.2, -54.8, 1, 1, 'coast station, telegraphy'),
      byHand('Quorrel coast radio', 'QSCR', 2182, 32.2, -54.8, 1, 1, 'coast station, calling'),
      byHand('Quorrel amateur beacon', 'QSAB', 475, 33.9, -54.6, 0.001, 0.001, 'amateur beacon'),
      byHand('Quorrel World Service', 'QSW1', 5985, 31, -58, 50, 50, 'abroad, evenings'),
      byHand('Quorrel World Service', 'QSW2', 9690, 31, -58, 50, 50, 'abroad, mornings'),
      byHand('Quorrel World Service', 'QSW3', 15145, 31, -58, 50, 0, 'abroad, by day'),
    ],
  },
];

/** All rows of a demo list, by frequency and name. */
export function demoRows({ plan, byHand: planned }: DemoList): ListRow[] {
  return [...planned, ...listRows(plan)].sort(
    (a, b) => a.frequency_khz - b.frequency_khz || (a.name < b.name ? -1 : 1),
  );
}

function byHand(
  name: string,
  call_sign: string,
  frequency_khz: number,
  latitude: number,
  longitude: number,
  power_day_kw: number,
  power_night_kw: number,
  note: string,
): ListRow {
  return {
    name,
    call_sign,
    frequency_khz,
    latitude,
    longitude,
    power_day_kw,
    power_night_kw,
    note,
  };
}
