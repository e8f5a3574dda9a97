import { Pipe, type PipeTransform } from '@angular/core';

import type { RasterRange } from '../../../shared/radio/station';

/** Writes a raster as people say it: "531–1602 kHz by 9 kHz". */
export function formatRaster(raster: readonly RasterRange[]): string {
  if (raster.length === 0) return $localize`no raster`;
  return raster.map(formatRange).join(', ');
}

/** `{{ region.raster | raster }}` */
@Pipe({ name: 'raster' })
export class RasterPipe implements PipeTransform {
  transform(raster: readonly RasterRange[]): string {
    return formatRaster(raster);
  }
}

function formatRange({ lowHz, highHz, stepHz }: RasterRange): string {
  const low = lowHz / 1000;
  const high = highHz / 1000;
  const step = stepHz / 1000;
  return lowHz === highHz
    ? $localize`${low}:frequency:\u00a0kHz`
    : $localize`${low}:lowest:–${high}:highest:\u00a0kHz by ${step}:step:\u00a0kHz`;
}
