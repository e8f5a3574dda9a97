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

import { formatFrequency } from '../../ui/frequency-pipe';
import { type Frame } from '../frame';
import { bandUnit } from '../readings';
import { type DialScale } from './strip-layout';

/** Hertz by which a key moves the pointer; with Shift a tenth of it. */
const STEPS: Readonly<Record<string, number>> = {
  ArrowLeft: -1,
  ArrowDown: -1,
  ArrowRight: 1,
  ArrowUp: 1,
  PageDown: -10,
  PageUp: 10,
};
const STEP_HZ = 1000;
const FINEST_HZ = 100;

/** The pointer of a dial: a slider over the glass, moved by pointer or keys. */
@Component({
  selector: 'app-dial-pointer',
  template: `<span class="flag">{{ text() }}</span>`,
  styleUrl: './dial-pointer.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    role: 'slider',
    tabindex: '0',
    '[attr.aria-label]': 'label()',
    'aria-orientation': 'horizontal',
    '[attr.aria-valuemin]': 'limits().low',
    '[attr.aria-valuemax]': 'limits().high',
    '[attr.aria-valuenow]': 'dialHz()',
    '[attr.aria-valuetext]': 'spoken()',
    '[style.left.px]': 'left()',
    '[style.visibility]': 'isShown() ? null : "hidden"',
    '(keydown)': 'press($event)',
    '(keyup)': 'settled.emit()',
    '(pointerdown)': 'grasp($event)',
    '(pointermove)': 'drag($event)',
    '(lostpointercapture)': 'drop()',
  },
})
export class DialPointer {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  /** Name of the dial, for people who do not see it. */
  readonly dial = input.required<string>();
  readonly scale = input.required<DialScale>();
  readonly frame = input.required<Frame>();
  readonly limits = input.required<{ readonly low: number; readonly high: number }>();
  readonly dialHz = model.required<number>();
  /** The pointer was let go, or a key released. */
  readonly settled = output();

  /** Distance between finger and pointer while it is held. */
  private heldBy: number | null = null;

  protected readonly label = computed(() => $localize`Pointer of the dial, ${this.dial()}:band:`);
  protected readonly text = computed(() => bandUnit(this.limits().high).write(this.dialHz()));
  protected readonly spoken = computed(() => formatFrequency(this.dialHz()));
  private readonly at = computed(() => this.scale()(this.dialHz()));
  protected readonly left = computed(() => this.frame().margin.left + this.at());
  protected readonly isShown = computed(
    () => this.at() >= -0.5 && this.at() <= this.frame().innerWidth + 0.5,
  );

  protected press(event: KeyboardEvent): void {
    const { low, high } = this.limits();
    const ends: Readonly<Record<string, number>> = { Home: low, End: high };
    const steps = STEPS[event.key];
    const by = event.shiftKey ? STEP_HZ / 10 : STEP_HZ;
    const target = steps === undefined ? ends[event.key] : this.dialHz() + steps * by;
    if (target === undefined) return;
    event.preventDefault();
    this.put(target);
  }

  protected grasp(event: PointerEvent): void {
    if (event.button !== 0) return;
    this.host.setPointerCapture(event.pointerId);
    this.heldBy = event.clientX - this.left();
  }

  protected drag(event: PointerEvent): void {
    if (this.heldBy === null) return;
    const x = event.clientX - this.heldBy - this.frame().margin.left;
    this.put(this.scale().invert(x));
  }

  protected drop(): void {
    if (this.heldBy === null) return;
    this.heldBy = null;
    this.settled.emit();
  }

  private put(hz: number): void {
    const { low, high } = this.limits();
    const fine = Math.round(hz / FINEST_HZ) * FINEST_HZ;
    this.dialHz.set(Math.min(Math.max(fine, low), high));
  }
}
