import type { ItuRegion } from '../../../shared/radio/site';
import { type SetType, setTypes } from '../core/set-types';

/** A set to begin with, for somebody who has none at hand. */
export interface Example {
  readonly name: string;
  readonly type: SetType | undefined;
  readonly ifHz: number;
  readonly ituRegion: ItuRegion;
}

const typeOf = (wanted: string) => setTypes.find(({ id }) => id === wanted);

/** IFs as they were in use: common practice. */
export const examples: readonly [Example, ...Example[]] = [
  {
    name: $localize`an early set, 110 kHz`,
    type: typeOf('domestic'),
    ifHz: 110_000,
    ituRegion: 1,
  },
  {
    name: $localize`the usual 455 kHz`,
    type: typeOf('domestic'),
    ifHz: 455_000,
    ituRegion: 1,
  },
  {
    name: $localize`560 kHz in the Americas`,
    type: typeOf('communications'),
    ifHz: 560_000,
    ituRegion: 2,
  },
];
