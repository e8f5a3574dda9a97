/**
 * Ground wave over a path of several kinds of ground: land and sea.
 *
 * Source: G. Millington, Proc. IEE 96 III (1949), from memory, not re-read; the rest is arithmetic.
 *
 * @module radio/propagation/mixed-path
 */
import type { Ground } from '../site.ts';
import { type Decibels, decibels, type Metres, metres } from '../units.ts';

/** A stretch of uniform ground. */
export interface PathSection {
  readonly ground: Ground;
  readonly lengthM: number;
}

/** Field of 1 kW over uniform ground at a distance, dB(uV/m). */
export type UniformField = (ground: Ground, distance: Metres) => Decibels;

/**
 * Field of the ground wave over a mixed path, by Millington's method.
 *
 *     forward = E1(d1) + sum over k > 1 of [Ek(d1 + ... + dk) - Ek(d1 + ... + dk-1)]
 *     E = (forward + backward) / 2
 *
 * backward the same from the other end, so that both directions give one field. Behind a coast the
 * field over the sea rises again, as is measured.
 *
 * Source: G. Millington, Ground-wave propagation over an inhomogeneous smooth earth, Proc. IEE 96
 * III (1949), as taken over in ITU-R P.368; from memory of both, not re-read.
 *
 * @param sections The sections in order, one at least; lengths in metres, above 0.
 * @param field The field over uniform ground.
 * @returns Field of 1 kW e.m.r.p., dB(uV/m).
 * @throws {RangeError} If there is no section or a length is not above 0.
 * @example
 *   millington(
 *     [{ ground: 'average', lengthM: 50_000 }],
 *     (ground, distance) => groundWave(hertz(1_000_000), GROUNDS[ground])(distance),
 *   ); // 57.03
 */
export function millington(sections: readonly PathSection[], field: UniformField): Decibels {
  if (sections.length === 0) throw new RangeError('path: needs a section at least');
  const forward = oneWay(sections, field);
  return decibels((forward + oneWay(sections.toReversed(), field)) / 2);
}

function oneWay(sections: readonly PathSection[], field: UniformField): number {
  let covered = metres(0);
  let level = 0;
  for (const { ground, lengthM } of sections) {
    if (!(lengthM > 0)) throw new RangeError(`path: a length must be above 0, got ${lengthM}`);
    const reached = metres(covered + lengthM);
    level += field(ground, reached) - (covered > 0 ? field(ground, covered) : 0);
    covered = reached;
  }
  return level;
}

/**
 * The same sections drawn out or pressed together to a length.
 *
 * @param sections The sections.
 * @param length Length of the whole, metres, above 0.
 * @returns Sections that add up to it.
 * @throws {RangeError} If the sections have no length.
 * @example
 *   scaledTo([{ ground: 'sea', lengthM: 990 }], metres(1000)); // [{ ground: 'sea', lengthM: 1000 }]
 */
export function scaledTo(sections: readonly PathSection[], length: Metres): PathSection[] {
  const scale = length / totalLength(sections);
  if (!(scale > 0 && scale < Infinity)) throw new RangeError('path: the sections have no length');
  return sections.map(({ ground, lengthM }) => ({ ground, lengthM: lengthM * scale }));
}

/**
 * Length of all sections together.
 *
 * @param sections The sections.
 * @returns Metres.
 * @example
 *   totalLength([{ ground: 'sea', lengthM: 990 }]); // 990
 */
export const totalLength = (sections: readonly PathSection[]): number =>
  sections.reduce((sum, { lengthM }) => sum + lengthM, 0);
