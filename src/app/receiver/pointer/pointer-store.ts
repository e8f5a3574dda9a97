import { computed, inject, Injectable, linkedSignal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, type ParamMap, Router } from '@angular/router';

import { latestAnswer } from '../trial/latest-answer';
import { sourceFields } from '../trial/station-source';
import { TrialApi } from '../trial/trial-api';
import { TrialStore } from '../trial/trial-store';

/** What is asked about a dial setting; what was not noted is null. */
export interface PointerQuestion {
  readonly dialHz: number | null;
  readonly pitchHz: number | null;
  /** Hertz of pitch per hertz of dial. */
  readonly pitchSlope: number | null;
}

const numberIn = (params: ParamMap, key: string): number | null => {
  const text = params.get(key);
  const value = text === null || text.trim() === '' ? NaN : Number(text);
  return Number.isFinite(value) ? value : null;
};

/** A dial setting, in the address, and what beats there. Provided by the section that shows it. */
@Injectable()
export class PointerStore {
  private readonly api = inject(TrialApi);
  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);
  private readonly trial = inject(TrialStore);
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });

  readonly asked = computed<PointerQuestion>(() => ({
    dialHz: numberIn(this.query(), 'dial'),
    pitchHz: numberIn(this.query(), 'pitch'),
    pitchSlope: numberIn(this.query(), 'slope'),
  }));
  private readonly bands = computed(() => this.trial.setup()?.receiver.bands ?? []);

  /** Where the pointer starts: at what is worst, else in the middle of the first band. */
  private readonly startHz = computed(() => {
    const worst = this.trial.judged
      .value()
      ?.bands.flatMap(({ responses }) => responses)
      .filter(({ dialHz, hidden, ratioDb }) => dialHz !== null && !hidden && ratioDb !== null)
      .sort((a, b) => (a.ratioDb ?? 0) - (b.ratioDb ?? 0))[0]?.dialHz;
    const [band] = this.bands();
    return worst ?? (band ? Math.round((band.lowHz + band.highHz) / 2) : null);
  });
  /** The dial setting pointed at, hertz; while it is moved it runs ahead of the address. */
  readonly dialHz = linkedSignal(() => this.asked().dialHz ?? this.startHz());

  readonly heard = latestAnswer(
    computed(
      () => {
        const [setup, dialHz] = [this.trial.setup(), this.dialHz()];
        if (!setup || dialHz === null || !this.isTuned(dialHz)) return null;
        const receiver = { ...setup.receiver, ifHz: this.trial.trialHz() };
        const { pitchHz, pitchSlope } = this.asked();
        const period = this.trial.time();
        const where = { site: setup.site, ...sourceFields(setup.source), period };
        return { receiver, ...where, dialHz, pitchHz, pitchSlope };
      },
      { equal: (one, other) => JSON.stringify(one) === JSON.stringify(other) },
    ),
    (body) => this.api.whistles(body),
  );

  /** Whether a band of the set tunes it. */
  isTuned(hz: number): boolean {
    return this.bands().some(({ lowHz, highHz }) => hz >= lowHz && hz <= highHz);
  }

  /** Writes where the pointer stands into the address. */
  settle(): void {
    const dialHz = this.dialHz();
    if (dialHz !== this.asked().dialHz) void this.ask({ ...this.asked(), dialHz }, true);
  }

  async ask({ dialHz, pitchHz, pitchSlope }: PointerQuestion, replaceUrl = false): Promise<void> {
    await this.router.navigate([], {
      relativeTo: this.route,
      queryParams: { dial: dialHz, pitch: pitchHz, slope: pitchSlope },
      queryParamsHandling: 'merge',
      replaceUrl,
      scroll: 'manual',
    });
  }
}
