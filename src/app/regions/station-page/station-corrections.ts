import { ChangeDetectionStrategy, Component, inject, input, output, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import type { CorrectionKind, CorrectionMark } from '../../../../shared/contracts/correction';
import type { Problem } from '../../../../shared/contracts/problem';
import { toProblem } from '../../core/api-problem';
import { Confirm } from '../../ui/confirm/confirm';
import { Icon } from '../../ui/icon/icon';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { CorrectionStore } from '../correction-store';
import { MarkWords } from './mark-words';

/** What was corrected of one station, to be taken back by who may. */
@Component({
  selector: 'app-station-corrections',
  imports: [Icon, MarkWords, MatButtonModule, ProblemNote],
  templateUrl: './station-corrections.html',
  styleUrl: './station-corrections.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationCorrections {
  private readonly store = inject(CorrectionStore);
  private readonly confirm = inject(Confirm);

  readonly regionId = input.required<number>();
  readonly corrections = input.required<readonly CorrectionMark[]>();
  /** One of that kind was taken back. */
  readonly changed = output<CorrectionKind>();

  /** Why a correction could not be taken back. */
  protected readonly refusal = signal<Problem | null>(null);

  protected async takeBack({ id, kind }: CorrectionMark): Promise<void> {
    const agreed = await this.confirm.ask({
      title: $localize`Take this correction back?`,
      text:
        kind === 'added'
          ? $localize`The station goes from every edition of the region, with all that was noted of it.`
          : $localize`The imported list counts again.`,
      agree: $localize`Take it back`,
      decline: $localize`Keep it`,
    });
    if (!agreed) return;
    this.refusal.set(null);
    try {
      await this.store.remove(this.regionId(), id);
      this.changed.emit(kind);
    } catch (error) {
      this.refusal.set(toProblem(error));
    }
  }
}
