import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';

import type { ReadablePlan } from '../../../../../shared/contracts/plan';
import type { Period } from '../../../../../shared/radio/site';
import { type JudgedBand, responseMark } from '../../../charts/band-strip/strip-layout';
import type { LedgerContext } from '../../ledger/ledger-facts';
import { openLedger } from '../../ledger/open-ledger';
import { ResponseTable } from '../../response-table/response-table';
import { stationName } from '../plan-words';
import { PlanDial } from './plan-dial';

/** What the plan found on the dial, and why; the working opens from any mark or row. */
@Component({
  selector: 'app-plan-heard',
  templateUrl: './plan-heard.html',
  styles: `
    :host,
    section {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 8px;
    }

    :host {
      gap: 32px;
    }
  `,
  imports: [PlanDial, ResponseTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanHeard {
  readonly plan = input.required<ReadablePlan>();
  readonly period = input.required<Period>();

  /** Mark picked in dial or table, and the response whose working is open. */
  protected readonly picked = signal<string | null>(null);
  protected readonly worked = signal<string | null>(null);

  protected readonly judgement = computed(() => this.plan().judged?.[this.period()]);
  protected readonly bands = computed<JudgedBand[]>(() =>
    (this.judgement()?.bands ?? []).map((band) => ({ ...band, totals: [] })),
  );
  /** Responses there were, and those the plan holds. */
  protected readonly counts = computed(() => ({
    total: this.bands().reduce((sum, { total }) => sum + total, 0),
    kept: this.bands().reduce((sum, { responses }) => sum + responses.length, 0),
  }));
  protected readonly nameOf = computed(() => {
    const plan = this.plan();
    return (place: number) => stationName(plan, place);
  });

  private readonly context = computed<LedgerContext | null>(() => {
    const id = this.worked();
    for (const [at, { name, responses }] of this.bands().entries()) {
      const response = responses.find((each) => responseMark(name, each) === id);
      if (!response) continue;
      const service = this.plan().receiver.bands[at]?.service ?? 'broadcast';
      return {
        response,
        band: name,
        service,
        nameOf: this.nameOf(),
        station: undefined,
        place: null,
      };
    }
    return null;
  });

  constructor() {
    openLedger(this.context, () => {
      this.worked.set(null);
    });
  }

  protected showWorking(id: string): void {
    this.picked.set(id);
    this.worked.set(id);
  }
}
