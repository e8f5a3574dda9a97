import {
  afterRenderEffect,
  ChangeDetectionStrategy,
  Component,
  computed,
  type ElementRef,
  input,
  linkedSignal,
  model,
  signal,
  viewChildren,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';

import { type JudgedBand } from '../../charts/band-strip/strip-layout';
import { type Cause } from '../../charts/cause-mark';
import { CauseSign } from '../../charts/cause-sign';
import { Ledger } from '../ledger/ledger';
import { ResponseFilter } from './response-filter';
import { causesHeard, type ResponseRow, responseRows } from './response-rows';

const PAGE = 20;

/** Everything that is heard where it does not belong, the worst first; each shows its working. */
@Component({
  selector: 'app-response-table',
  templateUrl: './response-table.html',
  styleUrl: './response-table.scss',
  imports: [CauseSign, Ledger, MatButtonModule, ResponseFilter],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ResponseTable {
  readonly bands = input.required<readonly JudgedBand[]>();
  readonly nameOf = input.required<(station: number) => string>();
  readonly picked = model<string | null>(null);
  /** Response whose working is open. */
  readonly worked = model<string | null>(null);

  private readonly openLedgers = viewChildren<ElementRef<HTMLElement>>('working');

  protected readonly causes = signal<readonly Cause[]>([]);
  protected readonly isHiddenShown = signal(false);
  protected readonly heard = computed(() => causesHeard(this.bands()));
  private readonly all = computed(() => {
    const filter = { causes: this.causes(), isHiddenShown: this.isHiddenShown() };
    const rows = responseRows(this.bands(), filter);
    const worked = this.worked();
    if (worked === null || rows.some(({ id }) => id === worked)) return rows;
    // A mark in a strip may lead to a row that the filter leaves out.
    const led = responseRows(this.bands(), { causes: [], isHiddenShown: true });
    return [...led.filter(({ id }) => id === worked), ...rows];
  });
  private readonly length = linkedSignal<number, number>({
    source: () => this.all().findIndex(({ id }) => id === this.worked()) + 1,
    computation: (needed, previous) => Math.max(PAGE, needed, previous?.value ?? 0),
  });
  protected readonly rows = computed(() => this.all().slice(0, this.length()));
  protected readonly rest = computed(() => this.all().length - this.rows().length);

  constructor() {
    afterRenderEffect(() => {
      const [ledger] = this.openLedgers();
      if (ledger && this.worked() !== null) ledger.nativeElement.focus();
    });
  }

  protected who({ stations }: ResponseRow): string {
    const [first = '', second] = stations.map((each) => this.nameOf()(each));
    return second === undefined ? first : $localize`${first}:station: with ${second}:other:`;
  }

  protected more(): void {
    this.length.update((length) => length + PAGE);
  }

  protected toggle(id: string): void {
    this.picked.set(id);
    this.worked.update((open) => (open === id ? null : id));
  }
}
