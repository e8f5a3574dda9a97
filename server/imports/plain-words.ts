/** Lower-case words without accents, punctuation or joined capitals: "Power_Day" is "power day". */
export function plainWords(text: string): string {
  return text
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .replace(/[\u0141\u0142]/g, 'l')
    .replace(/\u00df/g, 'ss')
    .replace(/[\u00d8\u00f8]/g, 'o')
    .replace(/(\p{Ll})(\p{Lu})(?=\p{Ll}{2})/gu, '$1 $2')
    .toLowerCase()
    .replace(/(\p{L}{3,}?)(khz|mhz|hz|kw|dbw)$/u, '$1 $2')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

/** Turns lists of synonyms by their meaning into the meaning by each synonym. */
export const meaningsByWord = <T>(
  lists: Readonly<Record<string, readonly string[]>>,
  named: (key: string) => T,
): ReadonlyMap<string, T> =>
  new Map(
    Object.entries(lists).flatMap(([key, list]) =>
      list.map((word): [string, T] => [plainWords(word), named(key)]),
    ),
  );
