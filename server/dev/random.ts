/**
 * Random numbers from a seed, the same everywhere: the mulberry32 generator.
 *
 * @param seed Any whole number.
 * @returns A function that gives the next number from 0 up to, but not, 1.
 */
export function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** One of the choices, all as likely. */
export function pick<T>(random: () => number, choices: readonly [T, ...T[]]): T {
  return choices[Math.floor(random() * choices.length)] ?? choices[0];
}
