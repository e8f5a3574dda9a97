import {
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  input,
  model,
  output,
} from '@angular/core';
import { type ScaleLinear } from 'd3';

import { formatFrequency } from '../../ui/frequency-pipe';
import { type Frame } from '../frame';
import { kilohertz } from '../readings';

const STEP = 100;
const MOVES: Readonly<Record<string, number>> = {
  ArrowLeft: -500,
  ArrowDown: -500,
  ArrowRight: 500,
  ArrowUp: 500,
  PageDown: -5000,
  PageUp: 5000,
};

/** The IF on trial: a slider on the chart's upper edge, moved by pointer or keys. */
@Component({
  selector: 'app-if-marker',
  template: `{{ text() }}`,
  styleUrl: './if-marker.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    role: 'slider',
    tabindex: '0',
    'aria-label': $localize`IF on trial`,
    'aria-orientation': 'horizontal',
    '[attr.aria-valuemin]': 'limits().low',
    '[attr.aria-valuemax]': 'limits().high',
    '[attr.aria-valuenow]': 'ifHz()',
    '[attr.aria-valuetext]': 'spoken()',
    '[style.left.px]': 'left()',
    '[style.visibility]': 'isShown() ? null : "hidden"',
    '(keydown)': 'press($event)',
    '(keyup)': 'release($event)',
    '(pointerdown)': 'grasp($event)',
    '(pointermove)': 'drag($event)',
    '(pointerup)': 'drop($event)',
    '(pointercancel)': 'drop($event)',
  },
})
export class IfMarker {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  readonly scale = input.required<ScaleLinear<number, number>>();
  readonly frame = input.required<Frame>();
  /** The ends of the chart. */
  readonly limits = input.required<{ readonly low: number; readonly high: number }>();
  readonly ifHz = model.required<number>();
  /** The marker was let go, or a key released. */
  readonly settled = output();

  /** Distance between pointer and marker while it is held. */
  private held: number | null = null;

  protected readonly text = computed(() => kilohertz(this.ifHz()));
  protected readonly spoken = computed(() => formatFrequency(this.ifHz()));
  protected readonly left = computed(() => this.frame().margin.left + this.scale()(this.ifHz()));
  protected readonly isShown = computed(() => {
    const at = this.scale()(this.ifHz());
    return at >= 0 && at <= this.frame().innerWidth;
  });

  protected press(event: KeyboardEvent): void {
    const { low, high } = this.limits();
    const ends: Readonly<Record<string, number>> = { Home: low, End: high };
    const move = MOVES[event.key];
    const target =
      move === undefined ? ends[event.key] : this.ifHz() + (event.shiftKey ? move / 5 : move);
    if (target === undefined) return;
    event.preventDefault();
    this.put(target);
  }

  protected release(event: KeyboardEvent): void {
    if (event.key in MOVES || event.key === 'Home' || event.key === 'End') this.settled.emit();
  }

  protected grasp(event: PointerEvent): void {
    if (event.button !== 0) return;
    this.host.setPointerCapture(event.pointerId);
    this.held = event.clientX - this.left();
  }

  protected drag(event: PointerEvent): void {
    if (this.held === null) return;
    const at = event.clientX - this.held - this.frame().margin.left;
    this.put(this.scale().invert(at));
  }

  protected drop(event: PointerEvent): void {
    if (this.held === null) return;
    this.held = null;
    this.host.releasePointerCapture(event.pointerId);
    this.settled.emit();
  }

  private put(hz: number): void {
    const { low, high } = this.limits();
    this.ifHz.set(Math.min(Math.max(Math.round(hz / STEP) * STEP, low), high));
  }
}
