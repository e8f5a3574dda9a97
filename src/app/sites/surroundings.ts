import type { Ground, NoiseClass } from '../../../shared/radio/site';

/** One class to choose from, in plain words. */
export interface Choice<T> {
  readonly value: T;
  readonly name: string;
  readonly words: string;
}

/** Ground between the stations and the aerial. Descriptions: common practice. */
export const GROUNDS: readonly Choice<Ground>[] = [
  {
    value: 'sea',
    name: $localize`Sea water`,
    words: $localize`Waves come in over the sea or a salt marsh; ground waves reach furthest.`,
  },
  {
    value: 'wet',
    name: $localize`Wet ground`,
    words: $localize`Marsh, river meadows, flat and moist farmland.`,
  },
  {
    value: 'average',
    name: $localize`Average ground`,
    words: $localize`Farmland, pasture and woods in rolling country. Take this if unsure.`,
  },
  {
    value: 'dry',
    name: $localize`Dry ground`,
    words: $localize`Sandy soil, steep hills, the outskirts of a town.`,
  },
  {
    value: 'poor',
    name: $localize`Poor ground`,
    words: $localize`Bare rock, mountains, desert, the middle of a large town.`,
  },
];

/** Surroundings that make the noise, after ITU-R P.372. Descriptions: common practice. */
export const NOISES: readonly Choice<NoiseClass>[] = [
  {
    value: 'city',
    name: $localize`City`,
    words: $localize`Offices, industry, blocks of flats, tramways.`,
  },
  {
    value: 'residential',
    name: $localize`Residential`,
    words: $localize`Streets of houses with gardens, a village. Take this if unsure.`,
  },
  {
    value: 'rural',
    name: $localize`Rural`,
    words: $localize`Farms and scattered houses.`,
  },
  {
    value: 'quiet',
    name: $localize`Quiet rural`,
    words: $localize`Far from houses, roads and power lines.`,
  },
];

/** What a class is called; empty where none was given. */
export function nameOf(choices: readonly Choice<string>[], value: unknown): string {
  return choices.find((choice) => choice.value === value)?.name ?? '';
}

/** What a class means; empty where none was given. */
export function wordsOf(choices: readonly Choice<string>[], value: unknown): string {
  return choices.find((choice) => choice.value === value)?.words ?? '';
}
