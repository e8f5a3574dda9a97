import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  model,
  output,
} from '@angular/core';

import type { Place } from '../../../../shared/radio/propagation/path';
import { Chart } from '../chart/chart';
import { frame, NARROW } from '../frame';
import { observeWidth } from '../observe-width';
import { placeLabels } from '../place-labels';
import { type Readout } from '../plot/plot-mark';
import { PlotLabels } from '../plot/plot-labels';
import type { ChartTable } from '../twin-table/twin-table';
import { Coastline } from './coastline';
import { ringKm } from './earth-paths';
import { MapEarth } from './map-earth';
import { markPaths, marksInView, type PlacedStation } from './map-marks';
import { inPicture, middleOf, type MapView, pixelsAKm, planeAround, wholeView } from './map-plane';
import { type MapStation, markRadius, type SizeScale } from './map-station';
import { MapSurface } from './map-surface';
import { MapTools } from './map-tools';

const MOST_LABELS = 14;

/** A place with its name. */
export interface NamedPlace extends Place {
  readonly name: string;
}

/**
 * Stations on the earth around a site, sized by their level; its twin is the table of the same
 * stations. Distances and bearings from the site are true.
 */
@Component({
  selector: 'app-station-map',
  templateUrl: './station-map.html',
  styleUrl: './station-map.scss',
  imports: [Chart, MapEarth, MapSurface, MapTools, PlotLabels],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationMap {
  readonly heading = input.required<string>();
  /** A sentence with the map's own numbers. */
  readonly description = input.required<string>();
  /** The strongest first. */
  readonly stations = input.required<readonly MapStation[]>();
  readonly sizes = input.required<SizeScale>();
  readonly describe = input.required<(id: string) => Readout | undefined>();
  readonly table = input.required<() => ChartTable>();
  /** The middle of the map; null: that of the stations. */
  readonly site = input<NamedPlace | null>(null);
  /** Distance of the ring around the site; null: a round one. */
  readonly ringM = input<number | null>(null);
  /** When day and night are shown; null: not at all. */
  readonly at = input<Date | null>(null);
  readonly leadsOn = input('');
  readonly picked = model<string | null>(null);
  readonly entered = output<string>();

  protected readonly coastline = inject(Coastline);
  private readonly width = observeWidth();
  protected readonly frame = computed(() => {
    const width = this.width();
    const height = width < NARROW ? Math.round(width * 0.9) : Math.min(520, width * 0.5);
    return frame(width, Math.round(height), { top: 0, right: 0, bottom: 0, left: 0 });
  });
  private readonly middle = computed(() => this.site() ?? middleOf(this.stations()), {
    equal: (a, b) => a.latitude === b.latitude && a.longitude === b.longitude,
  });
  protected readonly plane = computed(() => planeAround(this.middle()));
  private readonly placed = computed(() => {
    const plane = this.plane();
    return this.stations().map((station): PlacedStation => ({
      station,
      point: plane.project(station),
    }));
  });
  private readonly byId = computed(
    () => new Map(this.placed().map((each) => [each.station.id, each.point])),
  );
  protected readonly order = computed(() => this.stations().map(({ id }) => ({ id, x: 0, y: 0 })));
  protected readonly whole = computed(() =>
    wholeView(
      [...(this.site() ? [{ x: 0, y: 0 }] : []), ...this.placed().map(({ point }) => point)],
      this.frame(),
    ),
  );
  /** All stations at first, and again when there are others. */
  protected readonly view = linkedSignal<MapView>(() => this.whole());
  protected readonly marks = computed(() =>
    marksInView(this.placed(), this.view(), this.frame(), this.sizes()),
  );
  protected readonly paths = computed(() => markPaths(this.marks()));
  protected readonly isGrouped = computed(() => this.marks().some(({ others }) => others > 0));
  protected readonly placeOf = (id: string) => this.byId().get(id);

  protected readonly ring = computed(() => {
    const site = this.site();
    if (!site) return null;
    const km = (this.ringM() ?? 1000 * ringKm(this.view().acrossKm)) / 1000;
    const { x, y } = inPicture({ x: 0, y: 0 }, this.view(), this.frame());
    const radius = km * pixelsAKm(this.view(), this.frame());
    return { x, y, radius, text: $localize`${km}:distance: km`, name: site.name };
  });
  protected readonly labels = computed(() => {
    const strongest = this.marks().slice(0, MOST_LABELS);
    const requests = strongest.map(({ id, x, y, radius, station }, at) => ({
      id,
      text: station.name,
      spots: [
        { x, y: y - radius - 9 },
        { x, y: y + radius + 9 },
      ],
      weight: -at,
    }));
    return placeLabels(requests, [0, this.frame().width]);
  });
  protected readonly samples = computed(() =>
    this.sizes().samples.map(({ level, text }) => ({
      text,
      radius: markRadius(level, this.sizes()),
    })),
  );
  protected readonly read = (id: string): Readout | undefined => {
    const readout = this.describe()(id);
    const others = this.marks().find((mark) => mark.id === id)?.others ?? 0;
    if (!readout || others === 0) return readout;
    const line = { label: $localize`Beneath it`, value: $localize`${others}:count: weaker` };
    return { ...readout, lines: [...readout.lines, line] };
  };
}
