import type { Signal, WritableSignal } from '@angular/core';

import type { ReceiverDraft } from '../../../../shared/contracts/receiver';
import type { SiteDraft } from '../../../../shared/contracts/site';
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
}

/** Given by the page to the trial it shows. */
export abstract class TrialInputs {
  /** Null until everything is chosen. */
  abstract readonly setup: Signal<TrialSetup | null>;
  abstract readonly period: Signal<Period>;
  /** The IF on trial, hertz. */
  abstract readonly trialHz: WritableSignal<number>;
  /** Mark picked in any chart or table. */
  abstract readonly picked: WritableSignal<string | null>;
  /** Writes the IF on trial into the address. */
  abstract settle(): void;
}
