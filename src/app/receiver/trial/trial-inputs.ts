import type { Signal, WritableSignal } from '@angular/core';

import type { ReceiverDraft } from '../../../../shared/contracts/receiver';
import type { SiteDraft } from '../../../../shared/contracts/site';
import type { ReceptionTimeAsked } from '../../../../shared/contracts/quantities';
import type { Period } from '../../../../shared/radio/site';
import type { RasterRange } from '../../../../shared/radio/station';
import type { StationSource } from './station-source';

/** What is judged, wherever it comes from: a stored receiver or one that a visitor describes. */
export interface TrialSetup {
  readonly receiver: ReceiverDraft;
  /** The receiver as saved, where another set-up is on trial. */
  readonly saved?: ReceiverDraft;
  readonly site: SiteDraft;
  readonly source: StationSource;
  readonly raster: readonly RasterRange[];
  /** Further sites with their lists that one IF is to serve as well. */
  readonly others?: readonly TrialCase[];
}

/** A site and where its stations come from. */
export interface TrialCase {
  readonly name: string;
  readonly site: SiteDraft;
  readonly source: StationSource;
}

/** Given by the page to the trial it shows. */
export abstract class TrialInputs {
  /** Null until everything is chosen. */
  abstract readonly setup: Signal<TrialSetup | null>;
  /** Day or night, also where a moment is judged. */
  abstract readonly period: Signal<Period>;
  /** Day, night, or the moment that is judged. */
  abstract readonly time: Signal<ReceptionTimeAsked>;
  /** The IF on trial, hertz. */
  abstract readonly trialHz: WritableSignal<number>;
  /** Mark picked in any chart or table. */
  abstract readonly picked: WritableSignal<string | null>;
  /** Writes the IF on trial into the address. */
  abstract settle(): void;
}
