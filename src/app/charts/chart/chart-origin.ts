import type { Signal } from '@angular/core';

/** Something a chart rests on, in words: the receiver, the site, the list. */
export interface OriginFact {
  readonly label: string;
  readonly value: string;
}

/**
 * What the charts of a page rest on. The page provides it; every chart under it writes the facts
 * into what it saves and prints.
 */
export abstract class ChartOrigin {
  abstract readonly facts: Signal<readonly OriginFact[]>;
}
