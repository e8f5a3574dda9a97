import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';

import type { ReadablePlan } from '../../../../../shared/contracts/plan';
import type { Period } from '../../../../../shared/radio/site';
import { type JudgedBand, responseMark } from '../../../charts/band-strip/strip-layout';
import { dialParams, type DialView, readDialView } from '../../address/dial-view';
import { openLedger } from '../../ledger/open-ledger';
import type { LedgerContext } from '../../ledger/ledger-facts';
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

  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });
  /** What the address says is picked, and whose working is open. */
  protected readonly view = computed(() => readDialView(this.query()));

  protected readonly judgement = computed(() => this.plan().judged?.[this.period()]);
  protected readonly bands = computed<JudgedBand[]>(() =>
    (this.judgement()?.bands ?? []).map((band) => ({ ...band, totals: [] })),
  );
  protected readonly heard = computed(() =>
    this.bands().map((band) => ({
      ...band,
      responses: band.responses.filter(({ hidden }) => hidden === null),
    })),
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

  private readonly worked = computed(() => this.contextOf(this.view().working), {
    equal: (one, other) => one?.response === other?.response,
  });

  constructor() {
    openLedger(this.worked, () => {
      this.go({ working: null });
    });
  }

  /** Writes a choice into the address; the page follows it. */
  protected go(change: Partial<DialView>, replaceUrl = false): void {
    void this.router.navigate([], {
      relativeTo: this.route,
      queryParams: dialParams(change),
      queryParamsHandling: 'merge',
      replaceUrl,
      scroll: 'manual',
    });
  }

  private contextOf(id: string | null): LedgerContext | null {
    for (const [at, { name, responses }] of this.bands().entries()) {
      const response = responses.find((each) => responseMark(name, each) === id);
      if (!response) continue;
      const service = this.plan().receiver.bands[at]?.service ?? 'broadcast';
      const station = this.stationAt(response.station);
      return { response, band: name, service, nameOf: this.nameOf(), station, place: null };
    }
    return null;
  }

  /** Of its stations a plan keeps names and frequencies; of their fields those of the responses. */
  private stationAt(place: number): LedgerContext['station'] {
    const found = this.plan().stations[place];
    if (!found) return undefined;
    const { name, frequencyHz } = found;
    const unknown = { latitude: null, longitude: null, groundDb: null, skyDb: null };
    const notes = [$localize`not kept with the plan`];
    return { station: place, name, frequencyHz, ...unknown, distanceM: null, fieldDb: null, notes };
  }
}
