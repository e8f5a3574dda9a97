import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';

import { decibelsValue } from '../../../../shared/contracts/quantities';
import { formatQuantity, parseQuantity } from '../../ui/quantity/quantity';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { ASSUMED_FIELD_DB } from '../trial/station-source';

const EVERY_CHANNEL = 0;

/** At which site, against which list, by day or by night. */
@Component({
  selector: 'app-pickers',
  templateUrl: './pickers.html',
  styleUrl: './pickers.scss',
  imports: [
    MatButtonModule,
    MatButtonToggleModule,
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Pickers {
  protected readonly store = inject(ReceiverStore);

  protected readonly everyChannel = EVERY_CHANNEL;
  protected readonly fieldProblem = signal('');
  protected readonly sites = computed(() => this.store.sites.value()?.items ?? []);
  protected readonly editions = computed(() => this.store.editions.value()?.items ?? []);
  protected readonly source = computed(() => this.store.address().source);
  protected readonly listId = computed(() => {
    const source = this.source();
    return source?.kind === 'edition' ? source.editionId : EVERY_CHANNEL;
  });
  protected readonly fieldText = computed(() => {
    const source = this.source();
    return source?.kind === 'every-channel' ? formatQuantity(source.fieldDb, 'field') : '';
  });

  /** The moment that is judged, as people write it; empty: day or night everywhere. */
  protected readonly moment = computed(() => {
    const { at } = this.store.address();
    return at === undefined ? '' : new Date(at).toISOString().slice(0, 16).replace('T', ' ');
  });

  protected chooseList(editionId: number): void {
    const source =
      editionId === EVERY_CHANNEL
        ? ({ kind: 'every-channel', fieldDb: ASSUMED_FIELD_DB } as const)
        : ({ kind: 'edition', editionId } as const);
    void this.store.go({ source });
  }

  protected assume(typed: string): void {
    const reading = parseQuantity(typed, 'field');
    if ('problem' in reading) {
      this.fieldProblem.set(reading.problem);
      return;
    }
    const checked = decibelsValue.safeParse(reading.value);
    this.fieldProblem.set(checked.error?.issues[0]?.message ?? '');
    if (checked.success)
      void this.store.go({ source: { kind: 'every-channel', fieldDb: checked.data } });
  }
}
