import type { Assessment } from '../../../../shared/contracts/assessment';
import type { FieldStrengthsAnswer } from '../../../../shared/contracts/field-strengths';
import type { Receiver } from '../../../../shared/radio/receiver';
import type { Period, Site } from '../../../../shared/radio/site';
import type { RasterRange } from '../../../../shared/radio/station';

/** Stations with their fields at a site: sent to the worker once, judged by many times. */
export interface HeldList {
  readonly site: Site;
  readonly raster: readonly RasterRange[];
  readonly fields: FieldStrengthsAnswer['fields'];
}

/** What is judged against the list held; orders are those the server assesses by. */
export interface TrialQuestion {
  readonly receiver: Receiver;
  readonly period: Period;
  readonly limit: number;
}

export type TrialMessage =
  | { readonly kind: 'hold'; readonly list: HeldList }
  | { readonly kind: 'assess'; readonly question: TrialQuestion };

export type TrialReply =
  | { readonly kind: 'judged'; readonly assessment: Assessment }
  | { readonly kind: 'failed'; readonly message: string };
