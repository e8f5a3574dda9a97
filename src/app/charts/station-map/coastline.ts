import { httpResource } from '@angular/common/http';
import { computed, Injectable } from '@angular/core';
import { feature } from 'topojson-client';
import type { GeometryCollection, Topology } from 'topojson-specification';

/** Natural Earth's land at 1:50 million, shipped with the pages. */
const ADDRESS = '/land-50m.json';

type Land = Topology<{ land: GeometryCollection }>;

/** The coastlines of the earth, fetched with the first map that is shown. */
@Injectable({ providedIn: 'root' })
export class Coastline {
  private readonly file = httpResource(() => ADDRESS, {
    parse: (body) => {
      const topology = body as Land;
      return feature(topology, topology.objects.land);
    },
  });

  readonly land = computed(() => (this.file.hasValue() ? this.file.value() : null));
  readonly isMissing = computed(() => this.file.error() !== undefined);
}
