import { Pipe, type PipeTransform } from '@angular/core';

const MEGAHERTZ_FROM = 3_000_000;

/** Writes whole hertz as people read them: kHz below 3 MHz, MHz from there on. */
export function formatFrequency(hz: number): string {
  return Math.abs(hz) < MEGAHERTZ_FROM ? `${hz / 1000}\u00a0kHz` : `${hz / 1e6}\u00a0MHz`;
}

/** 455000 becomes "455 kHz". */
@Pipe({ name: 'frequency' })
export class FrequencyPipe implements PipeTransform {
  transform(hz: number): string {
    return formatFrequency(hz);
  }
}
