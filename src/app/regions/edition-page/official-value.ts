import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { ListedStation } from '../../../../shared/contracts/station-list';
import { type StationFact, writtenFact } from '../correction-words';

/** What the imported list says, where somebody changed it. */
@Component({
  selector: 'app-official-value',
  template: `
    @if (official(); as official) {
      <span i18n>listed {{ official }}</span>
    }
  `,
  styles: `
    span {
      display: block;
      color: var(--fallow-quiet);
      font-size: 0.8125rem;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OfficialValue {
  readonly station = input.required<ListedStation>();
  readonly fact = input.required<StationFact>();

  protected readonly official = computed(() => {
    const station = this.station();
    if (!station.official) return null;
    const listed = writtenFact(station.official, this.fact());
    return listed === writtenFact(station, this.fact()) ? null : listed;
  });
}
