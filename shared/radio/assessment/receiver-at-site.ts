/**
 * A receiver set up at a site: every band over the stations that are on the air.
 *
 * Source: own rule; the parts name theirs.
 *
 * @module radio/assessment/receiver-at-site
 */
import { BandScan } from './band-scan.ts';
import { Dial } from './dial.ts';
import { FrontEnd } from '../circuits/front-end.ts';
import { MAX_OSCILLATOR_ORDER } from '../mixing/product-levels.ts';
import { emissionWidth, programmeBands } from '../hearing/programme.ts';
import type { Receiver, Service } from '../receiver.ts';
import type { IfSelectivity } from '../circuits/selectivity.ts';
import type { Site } from '../site.ts';
import type { Spectrum } from '../channels/spectrum.ts';
import type { RasterRange } from '../station.ts';
import { programmeWeighting, toneWeighting } from '../hearing/weighting.ts';
import { weightingGrid, WeightingTable } from '../hearing/weighting-table.ts';

/** Pitch of telegraphy where the receiver does not say, hertz. */
const USUAL_PITCH_HZ = 1_000;

/**
 * Weighting tables of one receiver in one ITU Region: one for each kind of listening and tuning
 * tolerance, made when first asked for.
 */
export class WeightingTables {
  private readonly grids = new Map<boolean, (step: number) => number>();
  private readonly tables = new Map<string, WeightingTable>();
  private readonly receiver: Receiver;
  readonly selectivity: IfSelectivity;
  private readonly region: Site['ituRegion'];
  /** Largest beat: a product of order m moves m times as fast as the dial. */
  private readonly widestHz: number;

  constructor(
    receiver: Receiver,
    selectivity: IfSelectivity,
    region: Site['ituRegion'],
    maxM: number = MAX_OSCILLATOR_ORDER,
  ) {
    this.receiver = receiver;
    this.selectivity = selectivity;
    this.region = region;
    this.widestHz = Math.max(1, maxM) * (selectivity.b60Hz / 2);
  }

  table(service: Service, toleranceHz: number): WeightingTable {
    const byTone = service === 'telegraphy' || service === 'beacon';
    const key = `${byTone}/${toleranceHz}`;
    const known = this.tables.get(key);
    if (known !== undefined) return known;
    const table = new WeightingTable(this.grid(byTone), toleranceHz, this.widestHz);
    this.tables.set(key, table);
    return table;
  }

  private grid(byTone: boolean): (step: number) => number {
    const known = this.grids.get(byTone);
    if (known !== undefined) return known;
    const { audioCornerHz, bfo } = this.receiver;
    const pitchHz = bfo === null || bfo.pitchHz === 0 ? USUAL_PITCH_HZ : bfo.pitchHz;
    const weighting = byTone
      ? toneWeighting(this.selectivity, pitchHz)
      : programmeWeighting(
          this.selectivity,
          audioCornerHz,
          programmeBands(emissionWidth(this.region)),
        );
    const grid = weightingGrid(weighting);
    this.grids.set(byTone, grid);
    return grid;
  }
}

/**
 * Sets up the bands of a receiver over the stations of a site.
 *
 * @param receiver The receiver.
 * @param site The site.
 * @param raster Raster of the region.
 * @param spectrum The stations.
 * @param tables Weighting tables, shared by all that is computed for the receiver.
 * @returns One scan a band, in the order of the bands.
 * @throws {RangeError} If a value of the receiver or the site is out of range.
 */
export function bandScans(
  receiver: Receiver,
  site: Site,
  raster: readonly RasterRange[],
  spectrum: Spectrum,
  tables: WeightingTables,
): BandScan[] {
  const { selectivity } = tables;
  return receiver.bands.map((band) => {
    const frontEnd = new FrontEnd(receiver, band);
    const weightingFor = (toleranceHz: number): WeightingTable =>
      tables.table(band.service, toleranceHz);
    const dial = new Dial({ band, site, raster, spectrum, frontEnd, selectivity, weightingFor });
    return new BandScan(receiver, dial, frontEnd);
  });
}
