import { computed, Directive, ElementRef, inject, input, model, output } from '@angular/core';

import { formatFrequency } from '../ui/frequency-pipe';
import { type Frame } from './frame';

/** A scale along a chart, as far as a marker needs it. */
export interface Along {
  (hz: number): number;
  invert(pixel: number): number;
}

/** Hertz by which a key moves a marker: alone, and with Shift. Page keys go ten times as far. */
export interface KeySteps {
  readonly hz: number;
  readonly fineHz: number;
}

const KEYS: Readonly<Record<string, number>> = {
  ArrowLeft: -1,
  ArrowDown: -1,
  ArrowRight: 1,
  ArrowUp: 1,
  PageDown: -10,
  PageUp: 10,
};
/** Markers stand on whole multiples of this. */
const GRAIN_HZ = 100;

/**
 * A slider that stands over a chart at a frequency and is moved along it: by pointer, so that what is
 * under the finger stays under it, and by keys. The component it belongs to gives its name and look.
 */
@Directive({
  host: {
    role: 'slider',
    tabindex: '0',
    'aria-orientation': 'horizontal',
    '[attr.aria-valuemin]': 'limits().low',
    '[attr.aria-valuemax]': 'limits().high',
    '[attr.aria-valuenow]': 'hz()',
    '[attr.aria-valuetext]': 'spoken()',
    '[style.left.px]': 'left()',
    '[style.visibility]': 'isShown() ? null : "hidden"',
    '(keydown)': 'press($event)',
    '(keyup)': 'release($event)',
    '(pointerdown)': 'grasp($event)',
    '(pointermove)': 'drag($event)',
    '(lostpointercapture)': 'drop()',
  },
})
export class MovedAlong {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  readonly scale = input.required<Along>();
  readonly frame = input.required<Frame>();
  readonly limits = input.required<{ readonly low: number; readonly high: number }>();
  readonly hz = model.required<number>();
  /** The marker was let go, or a key that moved it. */
  readonly settled = output();

  /** Set by the component as it is made. */
  steps: KeySteps = { hz: 1000, fineHz: 100 };
  /** Distance between pointer and marker while it is held. */
  private heldBy: number | null = null;

  private readonly at = computed(() => this.scale()(this.hz()));
  protected readonly spoken = computed(() => formatFrequency(this.hz()));
  protected readonly left = computed(() => this.frame().margin.left + this.at());
  protected readonly isShown = computed(
    () => this.at() >= -0.5 && this.at() <= this.frame().innerWidth + 0.5,
  );

  protected press(event: KeyboardEvent): void {
    const target = this.byKey(event);
    if (target === undefined) return;
    event.preventDefault();
    this.put(target);
  }

  protected release(event: KeyboardEvent): void {
    if (this.byKey(event) !== undefined) this.settled.emit();
  }

  protected grasp(event: PointerEvent): void {
    if (event.button !== 0) return;
    this.host.setPointerCapture(event.pointerId);
    this.heldBy = event.clientX - this.at();
  }

  protected drag(event: PointerEvent): void {
    if (this.heldBy !== null) this.put(this.scale().invert(event.clientX - this.heldBy));
  }

  protected drop(): void {
    if (this.heldBy === null) return;
    this.heldBy = null;
    this.settled.emit();
  }

  private byKey({ key, shiftKey }: KeyboardEvent): number | undefined {
    const { low, high } = this.limits();
    const ends: Readonly<Record<string, number>> = { Home: low, End: high };
    const times = KEYS[key];
    if (times === undefined) return ends[key];
    return this.hz() + times * (shiftKey ? this.steps.fineHz : this.steps.hz);
  }

  private put(hz: number): void {
    const { low, high } = this.limits();
    this.hz.set(Math.min(Math.max(Math.round(hz / GRAIN_HZ) * GRAIN_HZ, low), high));
  }
}
