import { computed, inject, Injectable } from '@angular/core';
import { forkJoin } from 'rxjs';

import { kilohertz } from '../../charts/readings';
import { caseKey, MOST_OTHERS, type PlaceAndList } from '../address/cases-address';
import { ReceiverStore } from '../receiver-page/receiver-store';
import { latestAnswer } from '../trial/latest-answer';
import { sourceFields } from '../trial/station-source';
import { TrialApi } from '../trial/trial-api';
import type { TrialCase } from '../trial/trial-inputs';
import { TrialStore } from '../trial/trial-store';

/** What one site says of the IF on trial. */
export interface CaseVerdict {
  readonly nowDb: number;
  readonly thenDb: number;
}

/** The further sites that one IF is to serve, and what each says of the one on trial. */
@Injectable()
export class CaseStore {
  private readonly api = inject(TrialApi);
  private readonly trial = inject(TrialStore);
  private readonly store = inject(ReceiverStore);

  readonly others = computed(() => this.store.address().others);
  readonly canAdd = computed(() => this.others().length < MOST_OTHERS);
  readonly frequency = computed(() => kilohertz(this.trial.trialHz()));

  /** The page's own site first. */
  private readonly cases = computed<TrialCase[]>(() => {
    const setup = this.trial.setup();
    if (!setup?.others?.length) return [];
    return [{ ...setup, name: this.store.site()?.name ?? '' }, ...setup.others];
  });

  /** Each site alone, so that none hides behind the worst. */
  readonly answer = latestAnswer(
    computed(
      () => {
        const receiver = this.trial.setup()?.receiver;
        const trialHz = this.trial.trialHz();
        const bodies = this.cases().map(({ site, source }) => ({
          receiver,
          site,
          ...sourceFields(source),
          fromHz: trialHz,
          toHz: trialHz,
          stepHz: 1,
        }));
        return bodies.length > 0 && receiver ? { receiver, bodies } : null;
      },
      { equal: (one, other) => JSON.stringify(one) === JSON.stringify(other) },
    ),
    ({ receiver, bodies }) =>
      forkJoin(bodies.map((body) => this.api.candidates({ ...body, receiver }))),
  );

  readonly rows = computed(() => {
    const said = (this.answer.value() ?? []).map(({ present, candidates }): CaseVerdict => ({
      nowDb: present.deficitDb,
      thenDb: candidates[0]?.deficitDb ?? present.deficitDb,
    }));
    const worstDb = Math.max(...said.map(({ thenDb }) => thenDb));
    return this.cases().map(({ name, source }, at) => ({
      name,
      list: this.listName(source),
      verdict: said[at],
      isWorst: said.length > 1 && said[at]?.thenDb === worstDb,
      key: at === 0 ? null : (this.keys()[at - 1] ?? null),
    }));
  });
  private readonly keys = computed(() => {
    const sites = this.store.sites.value()?.items ?? [];
    return this.others()
      .filter(({ siteId }) => sites.some(({ id }) => id === siteId))
      .map(caseKey);
  });

  async add(added: PlaceAndList): Promise<void> {
    const kept = this.others().filter((each) => caseKey(each) !== caseKey(added));
    await this.store.go({ others: [...kept, added] });
  }

  async remove(key: string): Promise<void> {
    await this.store.go({ others: this.others().filter((each) => caseKey(each) !== key) });
  }

  private listName(source: TrialCase['source']): string {
    if (source.kind === 'every-channel') {
      return $localize`${source.fieldDb}:field: dB(µV/m) on every channel`;
    }
    const edition = this.store.editions.value()?.items.find(({ id }) => id === source.editionId);
    return edition ? `${edition.regionName}, ${edition.label}` : '';
  }
}
