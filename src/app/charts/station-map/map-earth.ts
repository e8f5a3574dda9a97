import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';

import { type Frame } from '../frame';
import { Coastline } from './coastline';
import { drawnReach, earthPaths, nightPath } from './earth-paths';
import { type MapPlane, type MapView, pixelsAKm, reachOf } from './map-plane';

/**
 * Land, lines of latitude and longitude, and the night. Drawn once for a stretch of the earth; while
 * the map is moved, only the group's transform changes.
 */
@Component({
  selector: 'svg:g[appMapEarth]',
  template: `
    <svg:g [attr.transform]="transform()">
      <svg:path class="edge" vector-effect="non-scaling-stroke" [attr.d]="paths().edge" />
      <svg:path class="land" vector-effect="non-scaling-stroke" [attr.d]="paths().land" />
      <svg:path class="lines" vector-effect="non-scaling-stroke" [attr.d]="paths().lines" />
      @if (night(); as night) {
        <svg:path class="night" vector-effect="non-scaling-stroke" [attr.d]="night" />
      }
    </svg:g>
  `,
  styles: `
    path {
      fill: none;
      pointer-events: none;
    }

    .edge,
    .lines {
      stroke: var(--fallow-hairline);
    }

    .lines {
      stroke-opacity: 0.6;
    }

    .land {
      fill: var(--fallow-sunken);
      stroke: var(--fallow-edge);
      stroke-width: 0.75px;
      stroke-opacity: 0.7;
    }

    .night {
      fill: var(--fallow-ink);
      fill-opacity: 0.1;
      stroke: var(--fallow-edge);
      stroke-width: 1.25px;
      stroke-dasharray: 5 3;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MapEarth {
  private readonly coastline = inject(Coastline);

  readonly plane = input.required<MapPlane>();
  readonly view = input.required<MapView>();
  readonly frame = input.required<Frame>();
  /** When day and night are shown; null: not at all. */
  readonly at = input<Date | null>(null);

  private readonly reach = computed(() => drawnReach(reachOf(this.view(), this.frame())));
  protected readonly paths = computed(() =>
    earthPaths(this.coastline.land(), this.plane().middle, this.reach()),
  );
  protected readonly night = computed(() => {
    const at = this.at();
    return at && nightPath(at, this.plane().middle, this.reach());
  });
  protected readonly transform = computed(() => {
    const { x, y } = this.view();
    const { width, height } = this.frame();
    const scale = pixelsAKm(this.view(), this.frame());
    return `translate(${width / 2 - x * scale},${height / 2 - y * scale}) scale(${scale})`;
  });
}
