import words from '../../datasets/import-headers.json' with { type: 'json' };
import type { LetterO } from '../../shared/contracts/list-import.ts';
import { meaningsByWord, plainWords } from './plain-words.ts';

export type Axis = 'latitude' | 'longitude';

const SIGNS: Readonly<Record<string, readonly [Axis, 1 | -1]>> = {
  north: ['latitude', 1],
  south: ['latitude', -1],
  east: ['longitude', 1],
  west: ['longitude', -1],
};
const byWord = meaningsByWord(
  words.hemispheres,
  (name): readonly [Axis, 1 | -1] => SIGNS[name] ?? ['latitude', 1],
);

/** Sign of a coordinate by a hemisphere's letter or word; null when it is none of this axis. */
export function hemisphereSign(word: string, axis: Axis, letterO: LetterO): 1 | -1 | null {
  const plain = plainWords(word);
  if (plain === 'o') return axis === 'longitude' ? signOfO(letterO) : null;
  const meaning = byWord.get(plain);
  return meaning?.[0] === axis ? meaning[1] : null;
}

const signOfO = (letterO: LetterO): 1 | -1 | null =>
  letterO === 'east' ? 1 : letterO === 'west' ? -1 : null;

/**
 * What a letter O in longitudes means: east beside a W, west beside an E; otherwise it is left open,
 * as it is east in German and west in French, Spanish, Portuguese and Italian. Null: there is none.
 */
export function meaningOfO(cells: readonly string[]): LetterO {
  const letters = new Set(
    cells.flatMap(
      (cell) => /(?<![\p{L}])([EWO])(?![\p{L}])/iu.exec(cell)?.[1]?.toUpperCase() ?? [],
    ),
  );
  if (!letters.has('O')) return null;
  if (letters.has('W') === letters.has('E')) return 'open';
  return letters.has('W') ? 'east' : 'west';
}
