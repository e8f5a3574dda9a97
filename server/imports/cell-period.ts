import words from '../../datasets/import-headers.json' with { type: 'json' };
import { meaningsByWord, plainWords } from './plain-words.ts';

/** When the power of a row is used. */
export type Period = 'day' | 'night' | 'both' | 'critical';

const byWord = meaningsByWord(words.periods, (name) => name as Period);

/** The period that an hours cell names and says nothing beside; null for times and other text. */
export const readPeriod = (cell: string): Period | null =>
  cell === '' || cell.length > 40 ? null : (byWord.get(plainWords(cell)) ?? null);
