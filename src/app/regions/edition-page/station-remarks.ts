import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  LOCALE_ID,
} from '@angular/core';

import type { ListedStation } from '../../../../shared/contracts/station-list';
import { Icon } from '../../ui/icon/icon';
import { correctionIcons, correctionWords, latestOfEach } from '../correction-words';

/** What is to be said of a station beyond its figures: off the raster, corrected by whom, remarks. */
@Component({
  selector: 'app-station-remarks',
  imports: [Icon],
  template: `
    @if (!station().onRaster) {
      <span class="mark"
        ><app-icon name="warning" /> <ng-container i18n>off the raster</ng-container></span
      >
    }
    @for (mark of marks(); track mark.id) {
      <span class="mark"><app-icon [name]="mark.icon" /> {{ mark.words }}</span>
      @if (mark.note) {
        <q>{{ mark.note }}</q>
      }
    }
    {{ station().hours }} {{ station().note }}
  `,
  styles: `
    :host {
      color: var(--fallow-quiet);
    }
    .mark {
      color: var(--fallow-ink);
    }
    .mark,
    q {
      display: block;
    }
    app-icon {
      margin-inline-end: 0.3rem;
      font-size: 0.9rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationRemarks {
  private readonly locale = inject(LOCALE_ID);

  readonly station = input.required<ListedStation>();

  protected readonly marks = computed(() =>
    latestOfEach(this.station().corrections).map((mark) => ({
      ...mark,
      icon: correctionIcons[mark.kind],
      words: correctionWords(mark, this.locale),
    })),
  );
}
