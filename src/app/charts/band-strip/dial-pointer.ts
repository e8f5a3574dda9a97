import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';

import { MovedAlong } from '../moved-along';
import { bandUnit } from '../readings';

/** The pointer of a dial: a slider over the glass, moved by pointer or keys. */
@Component({
  selector: 'app-dial-pointer',
  template: `<span class="flag">{{ text() }}</span>`,
  styleUrl: './dial-pointer.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  hostDirectives: [
    {
      directive: MovedAlong,
      inputs: ['scale', 'frame', 'limits', 'hz: dialHz'],
      outputs: ['hzChange: dialHzChange', 'settled'],
    },
  ],
  host: { '[attr.aria-label]': 'label()' },
})
export class DialPointer {
  private readonly marker = inject(MovedAlong);

  /** Name of the dial, for people who do not see it. */
  readonly dial = input.required<string>();

  protected readonly label = computed(() => $localize`Pointer of the dial, ${this.dial()}:band:`);
  protected readonly text = computed(() =>
    bandUnit(this.marker.limits().high).write(this.marker.hz()),
  );
}
