import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import { gradeWord } from '../../charts/band-strip/grade-word';
import { type JudgedResponse } from '../../charts/band-strip/strip-layout';
import { distance, kilohertz } from '../../charts/readings';
import { formatFrequency } from '../../ui/frequency-pipe';
import { ledgerLines } from './ledger-words';

/** How a figure came about, term by term. */
@Component({
  selector: 'app-ledger',
  templateUrl: './ledger.html',
  styleUrl: './ledger.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Ledger {
  readonly response = input.required<JudgedResponse>();
  readonly nameOf = input.required<(station: number) => string>();

  protected readonly lines = computed(() => ledgerLines(this.response()));
  protected readonly title = computed(() => {
    const { name, station, dialHz } = this.response();
    const where = dialHz === null ? $localize`everywhere` : formatFrequency(dialHz);
    return $localize`${this.nameOf()(station)}:station: at ${where}:dial:: ${name}:product:`;
  });
  protected readonly facts = computed(() => {
    const { distanceM, beatHz, wantedStation, secondStation } = this.response();
    const wanted =
      wantedStation === null ? $localize`an assumed field` : this.nameOf()(wantedStation);
    return [
      { label: $localize`Distance`, value: distance(distanceM) },
      { label: $localize`Beat`, value: $localize`${kilohertz(beatHz)}:beat: kHz` },
      { label: $localize`Wanted`, value: wanted },
      ...(secondStation === undefined
        ? []
        : [{ label: $localize`With`, value: this.nameOf()(secondStation) }]),
      { label: $localize`Grade`, value: gradeWord(this.response()) },
    ];
  });
}
