import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { type Position } from '../scale-marks';

const HOURS = 24;
const ROOM = 52;

/** Minutes since midnight as hours and minutes: 06:30. */
export function clock(minutes: number): string {
  const whole = Math.round(minutes);
  const [hours, rest] = [Math.floor(whole / 60), whole % 60];
  return `${String(hours).padStart(2, '0')}:${String(rest).padStart(2, '0')}`;
}

/** The hours of a day along the foot of a chart. */
@Component({
  selector: 'svg:g[appTimeAxis]',
  template: `
    <svg:line class="base" [attr.x2]="length()" />
    @for (mark of hours(); track mark.hour) {
      <svg:line
        [class]="mark.text ? 'major' : 'tick'"
        [attr.y2]="mark.text ? 8 : 4"
        [attr.x1]="mark.at"
        [attr.x2]="mark.at"
      />
      @if (mark.text) {
        <svg:text y="22" [attr.x]="mark.at">{{ mark.text }}</svg:text>
      }
    }
    <svg:text class="unit" y="38" [attr.x]="length()">{{ label() }}</svg:text>
  `,
  styleUrl: '../axis/axis.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TimeAxis {
  /** From minutes since midnight to pixels. */
  readonly scale = input.required<Position>();
  readonly length = input.required<number>();
  readonly label = input.required<string>();

  protected readonly hours = computed(() => {
    const step = [2, 3, 4, 6, 12].find((each) => (each * this.length()) / HOURS >= ROOM) ?? 12;
    return Array.from({ length: HOURS + 1 }, (_, hour) => ({
      hour,
      at: this.scale()(60 * hour),
      text: hour % step === 0 ? clock(60 * hour) : '',
    }));
  });
}
