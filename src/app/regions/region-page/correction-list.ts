import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatPaginatorModule } from '@angular/material/paginator';

import type { Correction } from '../../../../shared/contracts/correction';
import type { Problem } from '../../../../shared/contracts/problem';
import { toProblem } from '../../core/api-problem';
import { Confirm } from '../../ui/confirm/confirm';
import { FrequencyPipe } from '../../ui/frequency-pipe';
import { Icon } from '../../ui/icon/icon';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { CORRECTIONS_SHOWN, CorrectionStore } from '../correction-store';
import { factName, STATION_FACTS, writtenFact } from '../correction-words';
import { MarkWords } from '../station-page/mark-words';

/** Everything that was corrected of a region's list, to be looked through and taken back. */
@Component({
  selector: 'app-correction-list',
  imports: [
    FrequencyPipe,
    Icon,
    Loading,
    MarkWords,
    MatButtonModule,
    MatPaginatorModule,
    ProblemNote,
  ],
  templateUrl: './correction-list.html',
  styleUrl: './correction-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CorrectionList {
  private readonly store = inject(CorrectionStore);
  private readonly confirm = inject(Confirm);

  readonly regionId = input.required<number>();

  protected readonly pageSize = CORRECTIONS_SHOWN;
  protected readonly page = signal(1);
  protected readonly corrections = this.store.list(this.regionId, this.page);
  /** Why a correction could not be taken back. */
  protected readonly refusal = signal<Problem | null>(null);

  /** What a changed station was changed to. */
  protected changes({ kind, fields }: Correction): string {
    if (kind !== 'changed' || !fields) return '';
    return STATION_FACTS.flatMap((fact) => {
      const value = writtenFact(fields, fact);
      return value === undefined ? [] : `${factName(fact)}: ${value}`;
    }).join('; ');
  }

  protected async takeBack({ id, station }: Correction): Promise<void> {
    const agreed = await this.confirm.ask({
      title: $localize`Take this correction back?`,
      text: $localize`What was noted of ${station.name || station.callSign}:station: goes; the imported list counts again.`,
      agree: $localize`Take it back`,
      decline: $localize`Keep it`,
    });
    if (!agreed) return;
    this.refusal.set(null);
    try {
      await this.store.remove(this.regionId(), id);
      this.corrections.reload();
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
