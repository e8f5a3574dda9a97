import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';

import { responseMark } from '../../charts/band-strip/strip-layout';
import { dialParams, type DialView, readDialView } from '../address/dial-view';
import { ZoomStore } from '../address/zoom-store';
import { verdictSentences } from '../advice/verdict-words';
import { DialStrips } from '../dial-strips/dial-strips';
import type { LedgerContext } from '../ledger/ledger-facts';
import { openLedger } from '../ledger/open-ledger';
import { HeardHere } from '../pointer/heard-here';
import { PointerStore } from '../pointer/pointer-store';
import { ResponseFilter } from '../response-table/response-filter';
import { causesHeard } from '../response-table/response-rows';
import { ResponseTable } from '../response-table/response-table';
import { TrialStore } from '../trial/trial-store';
import { TrialInput } from '../trial-input/trial-input';
import { filteredBands, leftOut } from './filtered-bands';

const sameMark = (one: LedgerContext | null, other: LedgerContext | null) =>
  one?.response === other?.response;

/** Section of a receiver: what is heard where on its dial, how strong, and why. */
@Component({
  selector: 'app-dial-page',
  templateUrl: './dial-page.html',
  styleUrl: './dial-page.scss',
  imports: [DialStrips, HeardHere, ResponseFilter, ResponseTable, TrialInput],
  providers: [PointerStore],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DialPage {
  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);
  protected readonly store = inject(TrialStore);
  protected readonly pointer = inject(PointerStore);
  protected readonly zoom = inject(ZoomStore);
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });

  protected readonly view = computed(() => readDialView(this.query()));
  protected readonly receiver = computed(() => this.store.setup()?.receiver);
  protected readonly windowOf = (at: number) => {
    const band = this.receiver()?.bands[at];
    return band ? this.zoom.of(at, band) : null;
  };
  private readonly all = computed(() => this.store.judged.value()?.bands ?? []);
  protected readonly heard = computed(() => causesHeard(this.all()));
  protected readonly bands = computed(() =>
    filteredBands(this.all(), this.view(), this.store.nameOf),
  );
  protected readonly leftOut = computed(() => leftOut(this.all(), this.bands()));
  protected readonly verdict = computed(() => {
    const judged = this.store.judged.value();
    if (!judged) return [];
    const present = this.store.isMoved() ? this.store.present.value() : undefined;
    return verdictSentences(judged.verdict, present, this.store.period(), this.store.nameOf);
  });
  private readonly worked = computed(() => this.contextOf(this.view().working), {
    equal: sameMark,
  });
  /** The address names a working, and there is none like it. */
  protected readonly isLost = computed(
    () => this.view().working !== null && this.all().length > 0 && this.worked() === null,
  );

  constructor() {
    openLedger(this.worked, () => this.go({ working: null }));
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
    if (id === null) return null;
    const setup = this.store.setup();
    for (const [at, { name, responses }] of this.all().entries()) {
      const response = responses.find((each) => responseMark(name, each) === id);
      if (!setup || !response) continue;
      const { latitude, longitude } = setup.site;
      return {
        response,
        band: name,
        service: setup.receiver.bands[at]?.service ?? 'broadcast',
        nameOf: this.store.nameOf,
        station: this.store.fields
          .value()
          ?.fields.find(({ station }) => station === response.station),
        place: latitude == null || longitude == null ? null : { latitude, longitude },
      };
    }
    return null;
  }
}
