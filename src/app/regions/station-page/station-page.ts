import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { ActivatedRoute, Router, RouterLink } from '@angular/router';

import { distance, field } from '../../charts/readings';
import { FrequencyPipe } from '../../ui/frequency-pipe';
import { Icon } from '../../ui/icon/icon';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { factName, STATION_FACTS, writtenFact } from '../correction-words';
import { stationQueryFrom } from '../edition-address';
import { EditionStore } from '../edition-store';
import { isLibrarian } from '../is-librarian';
import { StationCorrections } from './station-corrections';
import { TickForm } from './tick-form';

/** One station of an edition: what is listed, what was corrected and by whom. */
@Component({
  selector: 'app-station-page',
  imports: [
    FrequencyPipe,
    Icon,
    Loading,
    MatButtonModule,
    ProblemNote,
    RouterLink,
    StationCorrections,
    TickForm,
  ],
  templateUrl: './station-page.html',
  styleUrl: './station-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationPage {
  private readonly store = inject(EditionStore);
  private readonly router = inject(Router);

  /** Id of the edition. */
  readonly id = input.required<string>();
  readonly stationId = input.required<string>();

  private readonly address = toSignal(inject(ActivatedRoute).queryParamMap, { requireSync: true });
  protected readonly query = computed(() => stationQueryFrom(this.address()));
  protected readonly edition = this.store.one(this.id);
  protected readonly station = this.store.station(this.id, this.stationId, this.query);
  protected readonly isLibrarian = isLibrarian();
  protected readonly facts = computed(() => {
    const station = this.station.value();
    if (!station) return [];
    return STATION_FACTS.map((fact) => {
      const value = writtenFact(station, fact) ?? '–';
      const listed = station.official ? writtenFact(station.official, fact) : value;
      return { name: factName(fact), value, listed: listed === value ? null : listed };
    });
  });
  protected readonly distance = distance;
  protected readonly field = field;

  /** Own name or call sign; a station may have neither. */
  protected readonly nameOf = ({ name = '', callSign = '' }): string =>
    name || callSign || $localize`A station without a name`;

  protected async leave(): Promise<void> {
    await this.router.navigate(['/editions', this.id()], { queryParamsHandling: 'preserve' });
  }
}
