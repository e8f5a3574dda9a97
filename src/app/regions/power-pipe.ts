import { Pipe, type PipeTransform } from '@angular/core';

/** Writes a radiated power as lists do: kW from 1 kW up, W below; 0 means silent. */
export function formatPower(watts: number | null): string {
  if (watts === null) return '–';
  if (watts === 0) return $localize`silent`;
  if (watts >= 1000) return `${rounded(watts / 1000)}\u00a0kW`;
  return `${rounded(watts)}\u00a0W`;
}

/** `{{ station.powerDayW | power }}` */
@Pipe({ name: 'power' })
export class PowerPipe implements PipeTransform {
  transform(watts: number | null): string {
    return formatPower(watts);
  }
}

const rounded = (value: number): number => Number(value.toPrecision(4));
