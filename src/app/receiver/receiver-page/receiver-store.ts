import { HttpClient } from '@angular/common/http';
import { computed, effect, inject, Injectable, linkedSignal, untracked } from '@angular/core';
import { takeUntilDestroyed, toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import { debounceTime, firstValueFrom } from 'rxjs';

import { pageOf } from '../../../../shared/contracts/paging';
import { type Plan, plan, type PlanInput } from '../../../../shared/contracts/plan';
import {
  bareReceiver,
  type ReceiverDraft,
  receiverDraft,
  storedReceiver,
} from '../../../../shared/contracts/receiver';
import { type Edition, edition, type Region, region } from '../../../../shared/contracts/region';
import { type NamedSite, type StoredSite, storedSite } from '../../../../shared/contracts/site';
import { defaultRaster } from '../../../../shared/radio/channels/raster';
import type { Period } from '../../../../shared/radio/site';
import { remote } from '../../core/remote';
import { addressParams, readAddress, type TrialAddress } from '../address/trial-address';
import { applyChanges, type Changes } from '../set-up-trial/changes';
import { ChangesAddress } from '../set-up-trial/changes-address';
import { ASSUMED_FIELD_DB, type StationSource } from '../trial/station-source';
import type { TrialCase, TrialInputs, TrialSetup } from '../trial/trial-inputs';

const MOST = 500;
/** Keys may go through many marks: the address follows when they rest. */
const PICKED_MS = 300;

/** A stored receiver on trial: what is chosen stands in the address. */
@Injectable()
export class ReceiverStore implements TrialInputs {
  private readonly http = inject(HttpClient);
  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);
  private readonly params = toSignal(this.route.paramMap, { requireSync: true });
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });

  private readonly changesAddress = inject(ChangesAddress);

  readonly id = computed(() => this.params().get('id') ?? '');
  readonly address = computed(() => readAddress(this.query()));
  readonly receiver = remote(
    () => `/api/receivers/${encodeURIComponent(this.id())}`,
    storedReceiver,
  );
  readonly sites = remote(() => `/api/sites?pageSize=${MOST}`, pageOf(storedSite));
  readonly editions = remote(() => `/api/editions?pageSize=${MOST}`, pageOf(edition));
  readonly edition = computed(() => {
    const { source } = this.address();
    if (source?.kind !== 'edition') return undefined;
    return this.editions.value()?.items.find(({ id }) => id === source.editionId);
  });
  readonly regions = remote(() => `/api/regions?pageSize=${MOST}`, pageOf(region));

  /** The receiver as saved, and what the address changes of it; null: it cannot be read. */
  private readonly saved = computed(() => {
    const receiver = this.receiver.value();
    return receiver && bareReceiver.parse(receiver);
  });
  private readonly tried = computed(() => {
    const saved = this.saved();
    return saved && changed(saved, this.changesAddress.read(this.address().setUp));
  });
  /** The address asks for a set-up that is not known here or could not be built. */
  readonly isTrialLost = computed(() => this.tried() === null);
  /** The receiver with what is on trial of its set-up, still with its present IF. */
  readonly trialReceiver = computed(() => this.tried() ?? this.saved());
  /** Null: the set-up is as saved. */
  readonly setUpOnTrial = computed(() => {
    const [saved, tried] = [this.saved(), this.tried()];
    return tried && JSON.stringify(tried) !== JSON.stringify(saved) ? tried : null;
  });

  readonly site = computed(() => {
    const { siteId } = this.address();
    return this.sites.value()?.items.find(({ id }) => id === siteId);
  });
  readonly period = computed<Period>(() => this.address().period);
  readonly time = computed(() => this.address().at ?? this.address().period);
  readonly trialHz = linkedSignal(() => this.address().ifHz ?? this.receiver.value()?.ifHz ?? 0);
  private readonly addressed = computed(() => this.address().picked ?? null);
  readonly picked = linkedSignal(() => this.addressed());
  readonly setup = computed<TrialSetup | null>(() => {
    const [receiver, saved, site] = [this.trialReceiver(), this.saved(), this.site()];
    const { source } = this.address();
    const raster = this.raster();
    if (!receiver || !saved || !site || !source || !raster) return null;
    const trial = this.setUpOnTrial() ? { saved } : {};
    const others = this.others();
    return { receiver, ...trial, site: bareSite(site), source, raster, others };
  });

  private readonly raster = computed(() => {
    const site = this.site();
    if (this.address().source?.kind === 'edition') return this.regionOf(this.edition())?.raster;
    return site && defaultRaster(site.ituRegion);
  });

  /** The further sites that the address names; those that are not there are left out. */
  private readonly others = computed(() => {
    const sites = this.sites.value()?.items ?? [];
    return this.address().others.flatMap(({ siteId, source }): TrialCase[] => {
      const site = sites.find(({ id }) => id === siteId);
      return site ? [{ name: site.name, site: bareSite(site), source }] : [];
    });
  });

  constructor() {
    toObservable(this.picked)
      .pipe(debounceTime(PICKED_MS), takeUntilDestroyed())
      .subscribe((picked) => {
        if (picked !== this.addressed()) void this.go({ picked: picked ?? undefined }, true);
      });
    effect(() => {
      const missing = this.missing();
      if (Object.keys(missing).length > 0) untracked(() => void this.go(missing, true));
    });
  }

  /** Writes a choice into the address; the page follows it. */
  async go(change: Partial<TrialAddress>, replaceUrl = false): Promise<void> {
    await this.router.navigate([], {
      relativeTo: this.route,
      queryParams: addressParams(change),
      queryParamsHandling: 'merge',
      replaceUrl,
      scroll: 'manual',
    });
  }

  settle(): void {
    const trialHz = this.trialHz();
    const ifHz = trialHz === this.receiver.value()?.ifHz ? undefined : trialHz;
    if (ifHz !== this.address().ifHz) void this.go({ ifHz });
  }

  async addSite(draft: NamedSite): Promise<void> {
    const added = storedSite.parse(await firstValueFrom(this.http.post('/api/sites', draft)));
    this.sites.reload();
    await this.go({ siteId: added.id }, true);
  }

  /** Keeps the IF on trial as a plan. Rejects with the server's problem. */
  async keep(draft: PlanInput): Promise<Plan> {
    const address = `/api/receivers/${encodeURIComponent(this.id())}/plans`;
    return plan.parse(await firstValueFrom(this.http.post(address, draft)));
  }

  private regionOf(listed: Edition | undefined): Region | undefined {
    return this.regions.value()?.items.find(({ id }) => id === listed?.regionId);
  }

  /** What the address does not say: the first site, and the newest list of its ITU Region. */
  private missing(): Partial<TrialAddress> {
    const editions = this.editions.value()?.items;
    const site = this.site() ?? this.sites.value()?.items[0];
    if (!site || !editions || !this.regions.value()) return {};
    const near = editions.find((each) => this.regionOf(each)?.ituRegion === site.ituRegion);
    const source: StationSource = near
      ? { kind: 'edition', editionId: near.id }
      : { kind: 'every-channel', fieldDb: ASSUMED_FIELD_DB };
    return {
      ...(this.address().siteId === undefined ? { siteId: site.id } : {}),
      ...(this.address().source === undefined ? { source } : {}),
    };
  }
}

/** Null where the changes cannot be read or make no receiver. */
function changed(saved: ReceiverDraft, changes: Changes | null): ReceiverDraft | null {
  const made = changes && receiverDraft.safeParse(applyChanges(saved, changes));
  return made?.data ?? null;
}

const bareSite = ({ id: _id, name: _name, editable: _editable, ...site }: StoredSite) => site;
