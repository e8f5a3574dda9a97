import { Pipe, type PipeTransform } from '@angular/core';

import { formatPlace } from './place';

interface PerhapsPlaced {
  readonly latitude: number | null;
  readonly longitude: number | null;
}

/** `{{ site | place }}` becomes "48.2° N, 16.4° E". */
@Pipe({ name: 'place' })
export class PlacePipe implements PipeTransform {
  transform({ latitude, longitude }: PerhapsPlaced): string {
    return formatPlace(latitude, longitude);
  }
}
