import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  linkedSignal,
  model,
  output,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { type JudgedBand } from '../../charts/band-strip/strip-layout';
import { CauseSign } from '../../charts/cause-sign';
import { type ResponseRow, responseRows } from './response-rows';

const PAGE = 20;

/** Everything that is heard where it does not belong, the worst first; each shows its working. */
@Component({
  selector: 'app-response-table',
  templateUrl: './response-table.html',
  styleUrl: './response-table.scss',
  imports: [CauseSign, MatButtonModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResponseTable {
  readonly bands = input.required<readonly JudgedBand[]>();
  readonly nameOf = input.required<(station: number) => string>();
  readonly picked = model<string | null>(null);
  /** Asks for the working behind a response. */
  readonly working = output<string>();

  private readonly all = computed(() => responseRows(this.bands()));
  /** Long enough to hold what is picked in a chart. */
  private readonly length = linkedSignal<number, number>({
    source: () => this.all().findIndex(({ id }) => id === this.picked()) + 1,
    computation: (needed, previous) => Math.max(PAGE, needed, previous?.value ?? 0),
  });
  protected readonly rows = computed(() => this.all().slice(0, this.length()));
  protected readonly rest = computed(() => this.all().length - this.rows().length);

  protected who({ stations }: ResponseRow): string {
    const [first = '', second] = stations.map((each) => this.nameOf()(each));
    return second === undefined ? first : $localize`${first}:station: with ${second}:other:`;
  }

  protected more(): void {
    this.length.update((length) => length + PAGE);
  }

  protected open(id: string): void {
    this.picked.set(id);
    this.working.emit(id);
  }
}
