import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { tenths } from '../../../charts/readings';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import type { comparedHarm, ComparedHarm } from './comparison';

/** Harmed stations of two plans: those it harms no longer, those it harms anew, and the rest. */
@Component({
  selector: 'app-harm-lists',
  template: `
    @for (list of lists(); track list.mark) {
      <section>
        <h3>
          <span aria-hidden="true">{{ list.mark }}</span> {{ list.title }}
        </h3>
        <ul>
          @for (each of list.stations; track $index) {
            <li>
              {{ each.name }}, {{ each.frequencyHz | frequency }}
              <span class="quiet">{{ ratios(each) }}</span>
            </li>
          } @empty {
            <li class="quiet" i18n>none</li>
          }
        </ul>
      </section>
    }
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(min(16rem, 100%), 1fr));
      gap: 16px 32px;
    }

    ul {
      margin: 4px 0 0;
      padding: 0;
      list-style: none;
    }
  `,
  imports: [FrequencyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HarmLists {
  readonly harm = input.required<ReturnType<typeof comparedHarm>>();

  protected readonly lists = computed(() => {
    const { removed, added, still } = this.harm();
    return [
      { mark: '▲', title: $localize`No longer harmed`, stations: removed },
      { mark: '▼', title: $localize`Newly harmed`, stations: added },
      { mark: '=', title: $localize`Harmed by both`, stations: still },
    ];
  });

  protected ratios({ first, second }: ComparedHarm): string {
    if (first === null) return $localize`now ${tenths(second ?? 0)}:ratio: dB`;
    if (second === null) return $localize`was ${tenths(first)}:ratio: dB`;
    return $localize`${tenths(first)}:first: → ${tenths(second)}:second: dB`;
  }
}
